package tunwarden.screen.view;

import java.time.DateTimeException;
import java.time.Instant;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.screen.model.Board;
import tunwarden.units.Display;
import tunwarden.units.InUnits;

/** Sentences of alarms and of the journal in the units and the time of day a person reads. */
final class Told {
  private static final Pattern INSTANT =
      Pattern.compile("\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?Z");

  private Told() {}

  static String of(String text, Display units, Board board) {
    return InUnits.of(inLocalTime(text, board), units);
  }

  private static String inLocalTime(String text, Board board) {
    return INSTANT
        .matcher(text)
        .replaceAll(found -> Matcher.quoteReplacement(local(found.group(), board)));
  }

  private static String local(String written, Board board) {
    try {
      return Words.when(Instant.parse(written), board);
    } catch (DateTimeException noTime) {
      return written;
    }
  }
}

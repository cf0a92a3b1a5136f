package tunwarden.wire.text;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.reading.Quality;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.Place;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.signal.Decoded;

/** Takes the values of a profile's fields out of one line of text. Stateless; never throws. */
public final class LineReader {
  private static final int DETAIL = 40;
  private static final Pattern NUMBER =
      Pattern.compile(
          "([+-]?\\s*(?:\\d{1,15}\\.?\\d{0,15}|\\.\\d{1,15})(?:[eE][+-]?\\d{1,3})?)(.*)");

  private final Profile profile;
  private final Framing framing;
  private final Pattern between;

  /** Reads lines as the profile frames them. */
  public LineReader(Profile profile) {
    this.profile = profile;
    this.framing = profile.framing();
    this.between = separator(framing);
  }

  /** What a line turned out to be. */
  public enum Verdict {
    /** It held at least one of the profile's fields. */
    UNDERSTOOD,
    /** It began otherwise than the profile says, or held none of its fields. */
    FOREIGN,
    /** Its checksum was missing or wrong. */
    DAMAGED
  }

  /**
   * A line that was read.
   *
   * @param verdict what it turned out to be
   * @param values by field name, only those the line spoke of
   */
  public record Line(Verdict verdict, Map<String, Decoded> values) {}

  /** Reads one line for the fields that are sent unasked or in answer to {@code sent}. */
  public Line read(String line, String sent) {
    int start = line.indexOf(framing.start());
    if (start < 0) {
      return new Line(Verdict.FOREIGN, Map.of());
    }
    Optional<String> body = Checks.proved(line.substring(start), framing.check());
    if (body.isEmpty()) {
      return new Line(Verdict.DAMAGED, Map.of());
    }
    Map<String, String> cells = cells(body.get().substring(framing.start().length()));
    Map<String, Decoded> values = new LinkedHashMap<>();
    for (Field field : profile.fields().values()) {
      String cell = field.number().send().equals(sent) ? cells.get(cellName(field.place())) : null;
      if (cell != null) {
        values.put(field.name(), decode(cell, field));
      }
    }
    return new Line(values.isEmpty() ? Verdict.FOREIGN : Verdict.UNDERSTOOD, values);
  }

  private Map<String, String> cells(String body) {
    Map<String, String> cells = new HashMap<>();
    String[] parts = between.split(body.strip(), -1);
    for (int i = 0; i < parts.length; i++) {
      String part = parts[i].strip();
      if (framing.layout() == Framing.Layout.COLUMNS) {
        cells.put(String.valueOf(i + 1), part);
        continue;
      }
      int join = part.indexOf(framing.joinedBy());
      if (join > 0) {
        String unit = i + 1 < parts.length && Spelling.isUnit(parts[i + 1]) ? parts[i + 1] : "";
        String value = part.substring(join + 1).strip();
        cells.put(part.substring(0, join).strip(), (value + " " + unit).strip());
      }
    }
    return cells;
  }

  private static String cellName(Place place) {
    if (place instanceof Place.Key key) {
      return key.key();
    }
    return place instanceof Place.Column column ? String.valueOf(column.number()) : "";
  }

  private Decoded decode(String cell, Field field) {
    if (field.number().faultWords().contains(cell)) {
      return Decoded.bad(Quality.LOOP_FAULT, "the instrument says " + Printable.of(cell, DETAIL));
    }
    Matcher matcher = NUMBER.matcher(framing.decimalComma() ? cell.replace(',', '.') : cell);
    if (!matcher.matches() || !Spelling.isAllowed(matcher.group(2).strip(), field)) {
      return Decoded.bad(Quality.UNREADABLE, "'" + Printable.of(cell, DETAIL) + "'");
    }
    return Measure.judge(Double.parseDouble(matcher.group(1).replaceAll("\\s", "")), field);
  }

  /** Blanks as separators count once however many there are; other characters part every time. */
  private static Pattern separator(Framing framing) {
    String quoted = Pattern.quote(framing.between());
    boolean pairs = framing.layout() == Framing.Layout.PAIRS;
    boolean blank = framing.between().isBlank();
    String set = framing.between().length() == 1 ? quoted : classOf(framing.between());
    return Pattern.compile(pairs || blank ? set + "+" : set);
  }

  private static String classOf(String characters) {
    StringBuilder set = new StringBuilder("[");
    characters.chars().forEach(c -> set.append(String.format("\\x%02x", c & 0xFF)));
    return set.append(']').toString();
  }
}

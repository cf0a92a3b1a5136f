package tunwarden.screen.view;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.units.Display;
import tunwarden.units.Kind;
import tunwarden.units.Unit;

/**
 * Sentences of alarms, forecasts and the journal carry metric quantities; here those are turned
 * into the units a person has chosen, so that no two units stand on one screen.
 */
final class InUnits {
  private static final String NUMBER = "(-?\\d+(?:\\.\\d+)?)";
  private static final Pattern QUANTITY =
      Pattern.compile(NUMBER + "(?:( to | and |–)" + NUMBER + ")? (bar|mbar|°C|g/L)(?![\\w/])");

  private InUnits() {}

  /** The text with its quantities in the display's units. */
  static String of(String text, Display units) {
    if (units.equals(Display.METRIC)) {
      return text;
    }
    Matcher found = QUANTITY.matcher(text);
    StringBuilder turned = new StringBuilder();
    while (found.find()) {
      found.appendReplacement(turned, Matcher.quoteReplacement(turn(found, units)));
    }
    return found.appendTail(turned).toString();
  }

  private static String turn(Matcher found, Display units) {
    Unit from = unit(found.group(4));
    String first = number(found.group(1), from, units);
    String second = found.group(3);
    String range = second == null ? "" : found.group(2) + number(second, from, units);
    return first + range + " " + symbol(from.kind(), units);
  }

  private static Unit unit(String symbol) {
    return switch (symbol) {
      case "bar" -> Unit.BAR;
      case "mbar" -> Unit.MBAR;
      case "°C" -> Unit.CELSIUS;
      default -> Unit.GRAM_PER_LITRE;
    };
  }

  private static String number(String written, Unit from, Display units) {
    double si = from.toSi(Double.parseDouble(written));
    return switch (from.kind()) {
      case PRESSURE -> units.pressureNumber(si);
      case TEMPERATURE -> Display.number(units.temperature().fromSi(si), 1);
      default -> units.gasContentNumber(si);
    };
  }

  private static String symbol(Kind kind, Display units) {
    return switch (kind) {
      case PRESSURE -> units.pressure().symbol();
      case TEMPERATURE -> "°" + units.temperature().symbol();
      default -> units.gasContent().symbol();
    };
  }
}

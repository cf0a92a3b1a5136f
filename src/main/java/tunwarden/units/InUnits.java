package tunwarden.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Sentences of alarms, forecasts and the journal carry quantities in the units they were written
 * in; here those are turned into the units a person has chosen, so that no two units stand on one
 * screen. A quantity that is in them already stays as it was written.
 */
public final class InUnits {
  private static final String NUMBER = "(-?\\d+(?:\\.\\d+)?)";
  private static final String BETWEEN = "( to | and |–| ± | becomes about ±)";
  private static final Pattern QUANTITY =
      Pattern.compile(
          "(\\bby |±)?"
              + NUMBER
              + "(?:"
              + BETWEEN
              + NUMBER
              + ")? (bar per °C|bar|mbar|psi|kPa|°C|°F|g/L|vol)(?![\\w/])");
  private static final String PER_DEGREE = " per °";

  private InUnits() {}

  /** The text with its quantities in the display's units. */
  public static String of(String text, Display units) {
    Matcher found = QUANTITY.matcher(text);
    StringBuilder turned = new StringBuilder();
    while (found.find()) {
      found.appendReplacement(turned, Matcher.quoteReplacement(turn(found, units)));
    }
    return found.appendTail(turned).toString();
  }

  private static String turn(Matcher found, Display units) {
    boolean perDegree = found.group(5).contains(PER_DEGREE);
    Unit from = perDegree ? Unit.BAR : unit(found.group(5));
    Unit to = target(from.kind(), units);
    boolean stays = to == from || from == Unit.MBAR && to == Unit.BAR;
    if (stays && !(perDegree && units.temperature() != Unit.CELSIUS)) {
      return found.group();
    }
    String before = found.group(1) == null ? "" : found.group(1);
    boolean difference = !before.isEmpty();
    String degree = perDegree ? PER_DEGREE + units.temperature().symbol() : "";
    double scale = perDegree ? 1 / units.temperature().differenceFromSi(1) : 1;
    String first = number(found.group(2), scale, from, units, difference);
    String between = found.group(3);
    boolean spread = between != null && between.contains("±");
    String second =
        between == null
            ? ""
            : between + number(found.group(4), scale, from, units, difference || spread);
    return before + first + second + " " + symbol(to) + degree;
  }

  private static Unit unit(String symbol) {
    return switch (symbol) {
      case "bar" -> Unit.BAR;
      case "mbar" -> Unit.MBAR;
      case "psi" -> Unit.PSI;
      case "kPa" -> Unit.KPA;
      case "°C" -> Unit.CELSIUS;
      case "°F" -> Unit.FAHRENHEIT;
      case "vol" -> Unit.VOLUMES;
      default -> Unit.GRAM_PER_LITRE;
    };
  }

  private static Unit target(Kind kind, Display units) {
    return switch (kind) {
      case PRESSURE -> units.pressure();
      case TEMPERATURE -> units.temperature();
      default -> units.gasContent();
    };
  }

  private static String symbol(Unit unit) {
    return unit.kind() == Kind.TEMPERATURE ? "°" + unit.symbol() : unit.symbol();
  }

  private static String number(
      String written, double scale, Unit from, Display units, boolean difference) {
    double value = scale * Double.parseDouble(written);
    double si = difference ? from.toSi(value) - from.toSi(0) : from.toSi(value);
    return switch (from.kind()) {
      case PRESSURE -> units.pressureNumber(si);
      case TEMPERATURE ->
          Display.number(
              difference
                  ? units.temperature().differenceFromSi(si)
                  : units.temperature().fromSi(si),
              1);
      default -> units.gasContentNumber(si);
    };
  }
}

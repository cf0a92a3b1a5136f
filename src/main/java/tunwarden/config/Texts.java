package tunwarden.config;

import java.util.Arrays;
import java.util.function.Function;
import java.util.stream.Collectors;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.BadInputException;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Display;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Closure;

/**
 * Texts that a person writes to quantities in SI, for cellar files and command lines alike. Each
 * refuses what cannot be with a {@link BadInputException} that says what would be right.
 */
public final class Texts {
  private static final double LEAST_PLATO = -5;
  private static final double MOST_PLATO = 50;

  private Texts() {}

  /** Pa, absolute whatever its unit says: for pressures that have no gauge form. */
  public static double absolutePa(String text) {
    return notNegative(text, Pressure.parse(text).pa());
  }

  /** Difference of two pressures, Pa. */
  public static double pressureDifferencePa(String text) {
    Pressure pressure = Pressure.parse(text);
    if (pressure.reference() == Pressure.Reference.ABSOLUTE) {
      throw new BadQuantityException("'" + text + "' is a difference; write it without 'a'");
    }
    return notNegative(text, pressure.pa());
  }

  /** Temperature, K. */
  public static double kelvin(String text) {
    double kelvin = Quantities.parse(text, Kind.TEMPERATURE);
    if (!(kelvin > 0)) {
      throw new BadQuantityException("'" + text + "' is below absolute zero");
    }
    return kelvin;
  }

  /** A quantity of a kind that cannot be negative, in SI. */
  public static Function<String, Double> of(Kind kind) {
    return text -> notNegative(text, Quantities.parse(text, kind));
  }

  /** Diameter above zero, m. */
  public static double diameterM(String text) {
    double metres = Quantities.parse(text, Kind.LENGTH);
    if (!(metres > 0)) {
      throw new BadQuantityException("'" + text + "' is no opening; write a diameter above zero");
    }
    return metres;
  }

  /** Extract or gravity of a drink, degrees Plato; finished ferments may lie below water. */
  public static double gravityPlato(String text) {
    double plato = Quantities.parse(text, Kind.EXTRACT);
    if (!(plato >= LEAST_PLATO && plato <= MOST_PLATO)) {
      throw new BadQuantityException(
          "'" + text + "' is no drink's extract; write from -5 to 50 P or 0.980 to 1.230 SG");
    }
    return plato;
  }

  /** Share of a whole, 0..1. */
  public static double share(String text) {
    double share = notNegative(text, Quantities.parse(text, Kind.FRACTION));
    if (share > 1) {
      throw new BadQuantityException("'" + text + "' is more than the whole; write at most 100 %");
    }
    return share;
  }

  /** A plain number above 0 and at most 1, such as a coefficient of discharge. */
  public static double coefficient(String text) {
    try {
      double value = Double.parseDouble(text.trim());
      if (value > 0 && value <= 1) {
        return value;
      }
    } catch (NumberFormatException ignored) {
      // told below, with the range
    }
    throw new BadQuantityException("'" + text + "' is not a number above 0 and at most 1");
  }

  /** Kind of drink. */
  public static LiquidKind liquidKind(String text) {
    return LiquidKind.ofWord(text).orElseThrow(() -> unknown(text, "a liquid", LiquidKind.words()));
  }

  /** Trade relation for beer. */
  public static BeerMethod beerMethod(String text) {
    return BeerMethod.ofWord(text)
        .orElseThrow(() -> unknown(text, "a method", words(BeerMethod.values(), BeerMethod::word)));
  }

  /** How the headspace is connected. */
  public static Closure closure(String text) {
    return Closure.ofWord(text)
        .orElseThrow(() -> unknown(text, "a closure", words(Closure.values(), Closure::word)));
  }

  /** A set of units to print in. */
  public static Display display(String text) {
    return switch (text) {
      case "metric" -> Display.METRIC;
      case "us" -> Display.US;
      case "si" -> Display.SI;
      default -> throw unknown(text, "a set of units", "metric, us, si");
    };
  }

  private static double notNegative(String text, double value) {
    if (!(value >= 0)) {
      throw new BadQuantityException("'" + text + "' is negative; write zero or more");
    }
    return value;
  }

  private static <T> String words(T[] values, Function<T, String> word) {
    return Arrays.stream(values).map(word).collect(Collectors.joining(", "));
  }

  private static BadInputException unknown(String text, String what, String known) {
    String near =
        Nearest.to(text, Arrays.asList(known.split(", ")))
            .map(word -> "; did you mean '" + word + "'?")
            .orElse("; write one of " + known);
    return new BadQuantityException("'" + text + "' is not " + what + near);
  }
}

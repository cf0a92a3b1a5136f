package tunwarden.forecast;

import tunwarden.estimate.Estimate.Spread;
import tunwarden.units.Display;

/**
 * Numbers in the sentences of forecasts: always bar, °C and g/L. Whoever shows a sentence turns
 * them into the units a person has chosen ({@link tunwarden.units.InUnits}).
 */
public final class Words {
  private static final double MINUTE_S = 60;
  private static final double HOUR_S = 3600;
  private static final double DAY_S = 86_400;

  private Words() {}

  /** A temperature, given in K. */
  public static String celsius(double kelvin) {
    return Display.METRIC.temperature(kelvin).replace(".0 ", " ");
  }

  /** A gauge pressure, Pa gauge. */
  public static String gauge(double paGauge) {
    return Display.METRIC.gauge(paGauge);
  }

  /** A difference of pressures, Pa. */
  public static String bar(double pa) {
    return Display.METRIC.pressureDifference(pa);
  }

  /** The ends of a range: "1.2 to 3.4". */
  public static String ends(Spread spread, double scale, int decimals) {
    return Display.number(scale * spread.low(), decimals)
        + " to "
        + Display.number(scale * spread.high(), decimals);
  }

  /** A length of time, given in s: "40 s", "12 min", "8.4 h", "3 days". */
  public static String time(double seconds) {
    if (seconds < 2 * MINUTE_S) {
      return Display.number(seconds, 0) + " s";
    }
    if (seconds < 2 * HOUR_S) {
      return Display.number(seconds / MINUTE_S, 0) + " min";
    }
    if (seconds < 2 * DAY_S) {
      return Display.number(seconds / HOUR_S, seconds < 10 * HOUR_S ? 1 : 0) + " h";
    }
    return Display.number(seconds / DAY_S, 0) + " days";
  }
}

package tunwarden.forecast;

import tunwarden.units.Display;

/** Numbers in the sentences of forecasts: bar, °C and hours, whatever the screen is set to. */
final class Words {
  private Words() {}

  static String celsius(double kelvin) {
    return Display.METRIC.temperature(kelvin).replace(".0 ", " ");
  }

  static String gauge(double paGauge) {
    return Display.METRIC.gauge(paGauge);
  }
}

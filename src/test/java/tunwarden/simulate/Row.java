package tunwarden.simulate;

/**
 * One row of a simulated log with the truth beside it.
 *
 * @param seconds since the start
 * @param paGauge what the gauge showed
 * @param kelvin what the thermometer showed
 * @param laboratory a laboratory value typed in at this time, kg/m3; NaN for none
 * @param truth what the vessel really held
 */
public record Row(double seconds, double paGauge, double kelvin, double laboratory, Truth truth) {
  /**
   * The truth at one time.
   *
   * @param dissolved kg/m3
   * @param equilibrium what it would hold at rest with the present headspace, kg/m3
   * @param airFraction air in the headspace, 0..1
   * @param held whether the pressure was pinned from outside
   */
  public record Truth(double dissolved, double equilibrium, double airFraction, boolean held) {}
}

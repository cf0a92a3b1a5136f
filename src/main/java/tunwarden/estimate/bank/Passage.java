package tunwarden.estimate.bank;

/**
 * The circumstances of one step in time, shared by every filter.
 *
 * @param seconds how long
 * @param solubility dissolved over partial pressure, kg/m3/Pa, in the middle
 * @param before what the headspace holds per Pa at the start, kg/m3/Pa
 * @param after the same at the end
 * @param supplyShare CO2 in whatever flows in, 0..1
 */
record Passage(double seconds, double solubility, double before, double after, double supplyShare) {
  double middle() {
    return 0.5 * (before + after);
  }
}

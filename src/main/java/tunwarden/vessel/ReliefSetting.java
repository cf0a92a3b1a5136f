package tunwarden.vessel;

/**
 * The relief valve's setting and how early a conforming valve may open.
 *
 * @param setPaGauge nameplate set pressure, Pa gauge
 * @param tolerancePa width of the band below the set pressure in which it may already open, Pa
 * @param rule where the tolerance comes from
 */
public record ReliefSetting(double setPaGauge, double tolerancePa, ReliefRule rule) {
  private static final double ISO_SHARE = 0.03;
  private static final double ISO_LEAST_PA = 0.1e5;
  private static final double ASME_SHARE = 0.03;
  private static final double PSI_PA = 6894.757293168361;
  private static final double ASME_STEP_PA = 70 * PSI_PA;

  /** The tolerance the user stated. */
  public static ReliefSetting stated(double setPaGauge, double tolerancePa) {
    return new ReliefSetting(setPaGauge, tolerancePa, ReliefRule.STATED);
  }

  /** ISO 4126-1:2013/Amd 1:2016: ±3 % of set or ±0.1 bar, whichever is greater. */
  public static ReliefSetting iso4126(double setPaGauge) {
    double tolerance = Math.max(ISO_SHARE * setPaGauge, ISO_LEAST_PA);
    return new ReliefSetting(setPaGauge, tolerance, ReliefRule.ISO_4126);
  }

  /** ASME BPVC VIII-1 UG-134(d)(1): ±2 psi up to and including 70 psi, ±3 % above. */
  public static ReliefSetting asme(double setPaGauge) {
    double tolerance = setPaGauge <= ASME_STEP_PA ? 2 * PSI_PA : ASME_SHARE * setPaGauge;
    return new ReliefSetting(setPaGauge, tolerance, ReliefRule.ASME);
  }

  /** Lowest pressure at which a conforming valve may open, Pa gauge. */
  public double earliestLiftPaGauge() {
    return setPaGauge - tolerancePa;
  }
}

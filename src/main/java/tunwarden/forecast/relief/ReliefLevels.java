package tunwarden.forecast.relief;

import tunwarden.vessel.ReliefRule;
import tunwarden.vessel.ReliefSetting;

/**
 * The pressures that follow from a relief setting, all in Pa gauge.
 *
 * @param earliestLiftPaGauge lowest pressure at which a conforming valve may open
 * @param operatingCeilingPaGauge highest pressure to work at so that the seat stays tight; zero or
 *     less for very low settings, where the rule leaves no room at all
 * @param lowestReseatPaGauge pressure at which a conforming valve has closed again at the latest
 * @param accumulationPaGauge highest pressure a full-flowing valve may let the vessel reach
 */
public record ReliefLevels(
    double earliestLiftPaGauge,
    double operatingCeilingPaGauge,
    double lowestReseatPaGauge,
    double accumulationPaGauge) {
  private static final double PSI_PA = 6894.757293168361;
  private static final double TENTH = 0.1;
  private static final double CEILING_LEAST_PA = 5 * PSI_PA;
  private static final double ISO_BLOWDOWN_SHARE = 0.15;
  private static final double ISO_BLOWDOWN_LEAST_PA = 0.3e5;
  private static final double ISO_OVERPRESSURE_LEAST_PA = 0.1e5;
  private static final double ASME_ACCUMULATION_LEAST_PA = 3 * PSI_PA;

  /**
   * The levels of a setting.
   *
   * <ul>
   *   <li>Operating ceiling: 10 % or 5 psi below set, the greater; ASME VIII-1 non-mandatory
   *       Appendix M (from memory).
   *   <li>Reseat: ISO 4126-1, blowdown of gas valves at most 15 % or 0.3 bar, the greater; used for
   *       every rule, because ASME VIII-1 states none.
   *   <li>Accumulation: ASME VIII-1 UG-125(c), 10 % or 3 psi above, for a setting under that rule;
   *       otherwise ISO 4126-1 overpressure, 10 % or 0.1 bar, the greater.
   * </ul>
   */
  public static ReliefLevels of(ReliefSetting setting) {
    double set = setting.setPaGauge();
    return new ReliefLevels(
        setting.earliestLiftPaGauge(),
        set - Math.max(TENTH * set, CEILING_LEAST_PA),
        Math.max(0, set - Math.max(ISO_BLOWDOWN_SHARE * set, ISO_BLOWDOWN_LEAST_PA)),
        set + overpressurePa(setting));
  }

  /** How far above the set pressure the rated flow is counted, Pa. */
  public static double overpressurePa(ReliefSetting setting) {
    double least =
        setting.rule() == ReliefRule.ASME ? ASME_ACCUMULATION_LEAST_PA : ISO_OVERPRESSURE_LEAST_PA;
    return Math.max(TENTH * setting.setPaGauge(), least);
  }
}

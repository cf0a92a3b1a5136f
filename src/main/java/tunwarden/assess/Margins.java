package tunwarden.assess;

import java.util.OptionalDouble;
import tunwarden.vessel.ReliefSetting;

/**
 * Distance to the relief valve's earliest conforming opening, counted from the upper end of the
 * reading's 95 % interval.
 *
 * @param reliefPa margin, Pa; negative when already above
 * @param shareOfSet margin over the set pressure
 * @param readingU95Pa the uncertainty of the reading that was taken off, Pa
 * @param warmingK how much warming it takes to lift the valve, K
 */
public record Margins(
    double reliefPa, double shareOfSet, double readingU95Pa, OptionalDouble warmingK) {

  /**
   * The margin alone, Pa.
   *
   * @param relief the valve's setting
   * @param paGauge the reading, Pa gauge
   * @param readingU95Pa its 95 % uncertainty, Pa
   */
  public static double reliefPa(ReliefSetting relief, double paGauge, double readingU95Pa) {
    return relief.earliestLiftPaGauge() - (paGauge + readingU95Pa);
  }
}

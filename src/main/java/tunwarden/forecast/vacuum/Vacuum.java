package tunwarden.forecast.vacuum;

import tunwarden.physics.liquid.WagnerPruss1993;

/**
 * Ways an otherwise empty, shut vessel loses its pressure; pressures are Pa absolute. The gas is
 * taken as ideal, which near and below one atmosphere is good to 1 %.
 */
public final class Vacuum {
  /** 2 NaOH + CO2 → Na2CO3 + H2O: kg of NaOH that one kg of CO2 uses up. */
  public static final double CAUSTIC_KG_PER_CO2_KG = 1.818;

  private Vacuum() {}

  /**
   * After gas saturated with water vapour has cooled: (p1 − ps(T1)) T2/T1 + ps(T2).
   *
   * @param paAbsolute pressure while hot
   * @param hotK temperature then, K
   * @param coldK temperature afterwards, K
   */
  public static double afterCooling(double paAbsolute, double hotK, double coldK) {
    double dry = Math.max(0, paAbsolute - WagnerPruss1993.pa(hotK));
    return dry * coldK / hotK + WagnerPruss1993.pa(coldK);
  }

  /**
   * After caustic has taken up part of the CO2, at the same temperature: p (1 − x f).
   *
   * @param paAbsolute pressure before
   * @param co2Fraction CO2 in the gas, mole fraction
   * @param takenUp share of the CO2 that the caustic binds, 0..1
   */
  public static double afterCaustic(double paAbsolute, double co2Fraction, double takenUp) {
    return paAbsolute * (1 - co2Fraction * takenUp);
  }

  /** NaOH that binds all CO2 in a gas space, kg. */
  public static double causticKg(double co2Kg) {
    return CAUSTIC_KG_PER_CO2_KG * co2Kg;
  }
}

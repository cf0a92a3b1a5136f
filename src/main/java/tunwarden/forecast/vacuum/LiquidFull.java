package tunwarden.forecast.vacuum;

/**
 * A vessel without headspace: the liquid is stiff, so warming moves the pressure by bars per
 * kelvin. dp/dT = (αl − αv) / (χ + (D/w)/E), the liquid's volume expansion less the shell's, over
 * the compressibility of the liquid and the give of a thin cylinder. The form is worked example E9
 * of the reference table, cited there from an engineering forum.
 *
 * @param liquidExpansionPerK volume expansion of the liquid, 1/K; negative for water below 4 °C
 * @param compressibilityPerPa of the liquid, 1/Pa
 */
public record LiquidFull(double liquidExpansionPerK, double compressibilityPerPa) {
  /** Volume expansion of plain carbon steel, 1/K. */
  public static final double STEEL_EXPANSION_PER_K = 36e-6;

  /** Young's modulus of steel, Pa. */
  public static final double STEEL_PA = 2e11;

  /**
   * Pressure gained per kelvin, Pa/K.
   *
   * @param diameterOverWall diameter of the shell over its wall thickness
   */
  public double risePaPerK(double diameterOverWall) {
    return (liquidExpansionPerK - STEEL_EXPANSION_PER_K)
        / (compressibilityPerPa + diameterOverWall / STEEL_PA);
  }
}

package tunwarden.estimate;

import java.time.Instant;

/**
 * What is believed about one vessel at one time. Concentrations are kg/m³ of liquid (g/L).
 *
 * @param at time of the newest reading used
 * @param pressurePaGauge filtered pressure, Pa gauge
 * @param temperatureK filtered liquid temperature, K
 * @param dissolvedKgPerM3 dissolved CO2
 * @param dissolvedU95KgPerM3 its 95 % half-width
 * @param equilibriumKgPerM3 what the liquid would hold if it were at rest with the present
 *     headspace
 * @param settled share of the way to equilibrium, 0..1
 * @param airFraction air in the headspace, mole fraction 0..1
 * @param airFractionU95 its 95 % half-width
 * @param mode how the headspace behaves
 * @param modeConfidence 0..1
 * @param transferPerS mass transfer coefficient kLa with its range
 * @param gasMadeKgPerM3PerS gas being made by fermentation
 * @param ignorance what the readings cannot tell at present and which short experiment would help;
 *     empty when nothing needs saying
 */
public record Estimate(
    Instant at,
    double pressurePaGauge,
    double temperatureK,
    double dissolvedKgPerM3,
    double dissolvedU95KgPerM3,
    double equilibriumKgPerM3,
    double settled,
    double airFraction,
    double airFractionU95,
    Mode mode,
    double modeConfidence,
    Spread transferPerS,
    double gasMadeKgPerM3PerS,
    String ignorance) {

  /**
   * A value with its 95 % range.
   *
   * @param low lower end
   * @param middle median
   * @param high upper end
   */
  public record Spread(double low, double middle, double high) {}
}

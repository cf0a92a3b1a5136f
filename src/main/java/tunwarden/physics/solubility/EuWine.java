package tunwarden.physics.solubility;

import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/** CO2 in wine: the EU and OIV relation at 20 °C, carried to other temperatures by van 't Hoff. */
final class EuWine implements TradeRelation {
  static final Correlation ABOUT =
      new Correlation(
          "EU wine relation",
          "c = 1.951e-5 p (0.86 - 0.01 A)(1 - 0.00144 S) at 20 C, g/L and Pa absolute; Regulation"
              + " (EEC) 2676/90, annex",
          Validity.ofCelsiusAndBar(0, 30, 0.6, 10),
          "2 % at 20 C; 3 to 4 % at 0 to 10 C",
          Correlation.Standing.SEEN);

  static final Correlation ABOUT_TEMPERATURE =
      new Correlation(
          "champagne temperature law",
          "heat of solution 24.8 kJ/mol, after papers of G. Liger-Belair",
          Validity.ofCelsiusAndBar(0, 30, 0.6, 10),
          "1 % against the EU relation at 20 C",
          Correlation.Standing.FROM_MEMORY);

  private static final double REFERENCE_K = 20 + Constants.ZERO_CELSIUS_K;
  private static final double HEAT_J_PER_MOL = 24_800;

  private final double slopeAtReference;

  EuWine(double alcoholPercent, double sugarKgPerM3) {
    slopeAtReference =
        1.951e-5 * (0.86 - 0.01 * alcoholPercent) * Math.max(0, 1 - 0.00144 * sugarKgPerM3);
  }

  @Override
  public double slope(double temperatureK) {
    double exponent = HEAT_J_PER_MOL / Constants.GAS_CONSTANT;
    return slopeAtReference * Math.exp(exponent * (1 / temperatureK - 1 / REFERENCE_K));
  }

  @Override
  public double offset() {
    return 0;
  }

  @Override
  public Validity heldBeyond() {
    return ABOUT.validity();
  }

  @Override
  public List<Correlation> correlations() {
    return List.of(ABOUT, ABOUT_TEMPERATURE);
  }
}

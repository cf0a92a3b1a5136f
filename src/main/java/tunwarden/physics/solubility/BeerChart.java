package tunwarden.physics.solubility;

import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;
import tunwarden.units.Unit;

/** CO2 in beer by a regression of the North American volumes chart. */
final class BeerChart implements TradeRelation {
  static final Correlation ABOUT =
      new Correlation(
          "beer chart regression",
          "V = (psig + 14.7)(0.01821 + 0.090115 exp(-(F - 32)/43.11)) - 0.003342; probably by A. J."
              + " deLange; chart of D. Miller, BrewingTechniques 2 (1994) no. 1, Table I",
          Validity.ofCelsiusAndBar(-1.2, 16, 0.6, 3),
          "0.02 volume rms and 0.06 at most of the chart, which was read from 30 to 47 F",
          Correlation.Standing.SEEN);

  private static final double VOLUME = Constants.CO2_VOLUME_KG_PER_M3;

  @Override
  public double slope(double temperatureK) {
    double fahrenheit = Unit.FAHRENHEIT.fromSi(temperatureK);
    double perPsi = 0.01821 + 0.090115 * Math.exp(-(fahrenheit - 32) / 43.11);
    return perPsi * VOLUME / Unit.PSI.toSi(1);
  }

  @Override
  public double offset() {
    return -0.003342 * VOLUME;
  }

  @Override
  public Validity heldBeyond() {
    return ABOUT.validity();
  }

  @Override
  public List<Correlation> correlations() {
    return List.of(ABOUT);
  }
}

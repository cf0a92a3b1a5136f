package tunwarden.physics.solubility;

import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;

/** CO2 in beer by the equation used by European breweries. */
final class EuropeanBeer implements TradeRelation {
  static final Correlation ABOUT =
      new Correlation(
          "European beer equation",
          "c = 10 p exp(-10.73797 + 2617.25/T), g/L and bar absolute; brewery analysis handbooks,"
              + " original not seen",
          Validity.ofCelsiusAndBar(-1, 25, 0.6, 3),
          "1 to 2 % above the beer chart; 3 % for beers far from the standard one",
          Correlation.Standing.SEEN);

  private static final double PA_PER_BAR = 1e5;

  @Override
  public double slope(double temperatureK) {
    return 10 * Math.exp(-10.73797 + 2617.25 / temperatureK) / PA_PER_BAR;
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
    return List.of(ABOUT);
  }
}

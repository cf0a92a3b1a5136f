package tunwarden.physics.solubility;

import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.liquid.Makeup;

/** CO2 in cider: the mean of beer's and wine's relations at its alcohol and sugar. */
final class CiderMean implements TradeRelation {
  static final Correlation ABOUT =
      new Correlation(
          "cider estimate",
          "mean of the European beer equation without extract and the EU wine relation",
          Validity.ofCelsiusAndBar(0, 25, 0.6, 3),
          "3 to 4 %, no measurements found",
          Correlation.Standing.ESTIMATE);

  private static final double SUGAR_PER_KG_PER_M3 = 0.00144; // the EU relation's own term

  private final TradeRelation beer = new EuropeanBeer();
  private final TradeRelation wine;
  private final Makeup makeup;
  private final double sugarFactor;

  CiderMean(Makeup makeup) {
    this.makeup = makeup;
    this.wine = new EuWine(100 * makeup.alcoholByVolume(), makeup.sugarKgPerM3());
    this.sugarFactor = Math.max(0, 1 - SUGAR_PER_KG_PER_M3 * makeup.sugarKgPerM3());
  }

  @Override
  public double slope(double temperatureK) {
    double asBeer =
        beer.slope(temperatureK) * Composition.withoutExtract(makeup, temperatureK) * sugarFactor;
    return (asBeer + wine.slope(temperatureK)) / 2;
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
    return List.of(ABOUT, EuropeanBeer.ABOUT, EuWine.ABOUT);
  }
}

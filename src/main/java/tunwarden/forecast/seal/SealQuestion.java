package tunwarden.forecast.seal;

import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.forecast.ferment.FermentationRate;

/**
 * A fermenting vessel somebody thinks of closing.
 *
 * @param nowPlato apparent extract now, degrees Plato
 * @param finalPlato apparent extract when it will have ended, degrees Plato
 * @param originalPlato extract before fermentation, degrees Plato; empty: as now
 * @param rate how fast gas is made
 * @param wanted carbonation wanted at the end
 */
public record SealQuestion(
    double nowPlato,
    double finalPlato,
    OptionalDouble originalPlato,
    FermentationRate rate,
    Optional<Wanted> wanted) {

  /**
   * Carbonation wanted once all is over.
   *
   * @param kgPerM3 dissolved CO2, kg/m³
   * @param atK temperature it is brought to, shut, K
   */
  public record Wanted(double kgPerM3, double atK) {}

  /** What is wrong with the question, as one sentence; empty when it can be answered. */
  public Optional<String> fault() {
    if (!(finalPlato <= nowPlato)) {
      return Optional.of(
          "the final gravity is above the present one; exchange them or measure again");
    }
    if (originalPlato.isPresent() && !(originalPlato.getAsDouble() >= nowPlato)) {
      return Optional.of(
          "the original gravity is below the present one; write the one before pitching");
    }
    return Optional.empty();
  }
}

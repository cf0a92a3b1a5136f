package tunwarden.physics.solubility;

import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;

/**
 * A relation of the trade that gives dissolved CO2 straight from the total pressure under CO2 and
 * water vapour, linear in that pressure: c = slope(T) · p + offset.
 */
interface TradeRelation {
  /** kg/m³ of liquid per Pa absolute. */
  double slope(double temperatureK);

  /** kg/m³ of liquid. */
  double offset();

  /** Where it is used as it stands; beyond, its ratio to water is held. */
  Validity heldBeyond();

  /** The correlations it is made of. */
  List<Correlation> correlations();
}

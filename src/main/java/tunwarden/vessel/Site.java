package tunwarden.vessel;

import java.util.Optional;
import tunwarden.units.Constants;

/**
 * Where the vessel stands.
 *
 * @param ambientPaAbsolute local atmosphere, Pa absolute
 * @param ambientU95Pa how well that is known (95 %), Pa; weather alone is about 30 mbar
 * @param room the room, if described
 */
public record Site(double ambientPaAbsolute, double ambientU95Pa, Optional<Room> room) {
  /** Weather about the standard atmosphere, common practice, no source. */
  public static final double WEATHER_U95_PA = 3000;

  /** Sea level, weather unknown. */
  public static final Site SEA_LEVEL =
      new Site(Constants.STANDARD_ATMOSPHERE_PA, WEATHER_U95_PA, Optional.empty());
}

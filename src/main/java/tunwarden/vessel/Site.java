package tunwarden.vessel;

import java.util.Optional;
import tunwarden.physics.site.StandardAtmosphere;
import tunwarden.units.BadInputException;
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

  /** Lowest and highest altitude the formula below is used for, m. */
  public static final double LOWEST_M = -500;

  public static final double HIGHEST_M = 5000;

  /** What a measured barometer is worth when nobody says: common practice, no source. */
  private static final double BAROMETER_U95_PA = 200;

  private static final double LEAST_PA = 0.5e5;
  private static final double MOST_PA = 1.1e5;

  /**
   * The standard atmosphere at an altitude, weather unknown (ISO 2533).
   *
   * @param altitudeM geopotential altitude, m, {@link #LOWEST_M} to {@link #HIGHEST_M}
   */
  public static Site atAltitude(double altitudeM) {
    if (!(altitudeM >= LOWEST_M && altitudeM <= HIGHEST_M)) {
      throw new BadInputException(
          "an altitude of " + altitudeM + " m is outside -500 to 5000 m; give the air pressure");
    }
    double pa = StandardAtmosphere.pa(altitudeM);
    return new Site(pa, WEATHER_U95_PA, Optional.empty());
  }

  /**
   * A place with a barometer.
   *
   * @param paAbsolute what it shows, Pa absolute, not reduced to sea level
   */
  public static Site measured(double paAbsolute) {
    if (!(paAbsolute >= LEAST_PA && paAbsolute <= MOST_PA)) {
      throw new BadInputException(
          "no inhabited place has that air pressure; write 0.5 to 1.1 bar, absolute");
    }
    return new Site(paAbsolute, BAROMETER_U95_PA, Optional.empty());
  }

  /** The same place with the room described. */
  public Site withRoom(Room described) {
    return new Site(ambientPaAbsolute, ambientU95Pa, Optional.of(described));
  }
}

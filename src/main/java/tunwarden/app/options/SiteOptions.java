package tunwarden.app.options;

import java.util.Optional;
import picocli.CommandLine.Option;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Site;

/** The atmosphere around the vessel. */
public final class SiteOptions {
  private static final double LEAST_PA = 0.5e5;
  private static final double MOST_PA = 1.1e5;

  /** What a measured barometer is worth when nobody says: common practice, no source. */
  private static final double BAROMETER_U95_PA = 200;

  @Option(
      names = "--ambient",
      paramLabel = "PRESSURE",
      converter = Convert.ToAbsolutePa.class,
      description = "Air pressure where the vessel stands, absolute, as '1.013 bar'.")
  private Double ambientPaAbsolute;

  @Option(
      names = "--altitude",
      paramLabel = "LENGTH",
      converter = Convert.ToMetres.class,
      description = "Altitude, in place of --ambient, as '2000 m'. Default: sea level.")
  private Double altitudeM;

  @Option(
      names = "--ambient-accuracy",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToPressureDifferencePa.class,
      description = "Air pressure, 95 %%. Default: 2 mbar if measured, 30 mbar (weather) if not.")
  private Double ambientU95Pa;

  /** Whether any of these options was given. */
  public boolean areGiven() {
    return ambientPaAbsolute != null || altitudeM != null || ambientU95Pa != null;
  }

  /** The site: what was stated, else sea level. */
  public Site site() {
    Site site = place();
    return ambientU95Pa == null
        ? site
        : new Site(site.ambientPaAbsolute(), ambientU95Pa, site.room());
  }

  private Site place() {
    if (ambientPaAbsolute != null && altitudeM != null) {
      throw new BadInputException("give --ambient or --altitude, not both");
    }
    if (altitudeM != null) {
      return Site.atAltitude(altitudeM);
    }
    if (ambientPaAbsolute == null) {
      return Site.SEA_LEVEL;
    }
    if (!(ambientPaAbsolute >= LEAST_PA && ambientPaAbsolute <= MOST_PA)) {
      throw new BadInputException(
          "--ambient: no inhabited place has that air pressure; write 0.5 to 1.1 bar, absolute");
    }
    return new Site(ambientPaAbsolute, BAROMETER_U95_PA, Optional.empty());
  }
}

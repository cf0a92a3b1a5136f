package tunwarden.app.options;

import picocli.CommandLine.Option;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Site;

/** The atmosphere around the vessel. */
public final class SiteOptions {
  @Option(
      names = "--ambient",
      paramLabel = "PRESSURE",
      converter = Convert.ToMeasuredSite.class,
      description = "Air pressure where the vessel stands, absolute, as '1.013 bar'.")
  private Site measured;

  @Option(
      names = "--altitude",
      paramLabel = "LENGTH",
      converter = Convert.ToSiteAtAltitude.class,
      description = "Altitude, in place of --ambient, as '2000 m'. Default: sea level.")
  private Site atAltitude;

  @Option(
      names = "--ambient-accuracy",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToPressureDifferencePa.class,
      description = "Air pressure, 95 %%. Default: 2 mbar if measured, 30 mbar (weather) if not.")
  private Double ambientU95Pa;

  /** Whether any of these options was given. */
  public boolean areGiven() {
    return measured != null || atAltitude != null || ambientU95Pa != null;
  }

  /** The site: what was stated, else sea level. */
  public Site site() {
    if (measured != null && atAltitude != null) {
      throw new BadInputException("give --ambient or --altitude, not both");
    }
    Site stated = measured != null ? measured : atAltitude != null ? atAltitude : Site.SEA_LEVEL;
    return ambientU95Pa == null
        ? stated
        : new Site(stated.ambientPaAbsolute(), ambientU95Pa, stated.room());
  }
}

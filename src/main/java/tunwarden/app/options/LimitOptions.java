package tunwarden.app.options;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Option;
import tunwarden.config.StatedLimits;
import tunwarden.units.BadInputException;
import tunwarden.units.Pressure;
import tunwarden.vessel.Limits;

/** The pressures that must not be passed. */
public final class LimitOptions {
  private static final Map<String, String> OPTIONS =
      Map.of(
          "relief", "--relief",
          "tolerance", "--tolerance",
          "vessel", "--limit",
          "vacuum", "--vacuum-limit");

  @Option(
      names = "--relief",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Set pressure of the relief valve. Without it nothing is said of margins.")
  private Pressure relief;

  @Option(
      names = "--tolerance",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToTolerance.class,
      description =
          "How far below its setting the valve may open, or ISO (4126-1) or ASME (VIII-1)."
              + " Default: ISO.")
  private StatedLimits.Tolerance tolerance;

  @Option(
      names = "--limit",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "What the vessel is rated for.")
  private Pressure vessel;

  @Option(
      names = "--vacuum-limit",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Lowest allowed pressure, as '-0.02 bar'. Default: 0 bar.")
  private Pressure vacuum;

  /** Whether any of these options was given. */
  public boolean areGiven() {
    return relief != null || tolerance != null || vessel != null || vacuum != null;
  }

  /**
   * The limits.
   *
   * @param ambientPaAbsolute the atmosphere that gauge pressures are counted from, Pa absolute
   * @throws BadInputException when they contradict each other
   */
  public Limits limits(double ambientPaAbsolute) {
    StatedLimits stated =
        new StatedLimits(
            gauge(relief, ambientPaAbsolute),
            Optional.ofNullable(tolerance),
            gauge(vessel, ambientPaAbsolute),
            gauge(vacuum, ambientPaAbsolute));
    try {
      return stated.check();
    } catch (StatedLimits.Contradiction fault) {
      throw new BadInputException(OPTIONS.get(fault.key()) + ": " + fault.getMessage(), fault);
    }
  }

  private static OptionalDouble gauge(Pressure pressure, double ambientPaAbsolute) {
    return pressure == null
        ? OptionalDouble.empty()
        : OptionalDouble.of(pressure.gaugePa(ambientPaAbsolute));
  }
}

package tunwarden.app.options;

import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Option;
import tunwarden.units.BadInputException;
import tunwarden.units.Pressure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;

/** The pressures that must not be passed. */
public final class LimitOptions {
  @Option(
      names = "--relief",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Set pressure of the relief valve. Without it nothing is said of margins.")
  private Pressure relief;

  @Option(
      names = "--tolerance",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToPressureDifferencePa.class,
      description = {
        "How far below its setting the valve may open. Default: ISO 4126-1, 3 %% of the",
        "setting, at least 0.1 bar."
      })
  private Double tolerancePa;

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
    return relief != null || tolerancePa != null || vessel != null || vacuum != null;
  }

  /**
   * The limits.
   *
   * @param ambientPaAbsolute the atmosphere that gauge pressures are counted from, Pa absolute
   * @throws BadInputException when they contradict each other
   */
  public Limits limits(double ambientPaAbsolute) {
    OptionalDouble rated = gauge(vessel, ambientPaAbsolute);
    OptionalDouble lowest = gauge(vacuum, ambientPaAbsolute);
    if (lowest.isPresent() && lowest.getAsDouble() > 0) {
      throw new BadInputException("--vacuum-limit: write zero or a negative gauge pressure");
    }
    Optional<ReliefSetting> setting = setting(ambientPaAbsolute);
    if (setting.isPresent()
        && rated.isPresent()
        && setting.get().setPaGauge() > rated.getAsDouble()) {
      throw new BadInputException("--relief: the setting is above the vessel limit (--limit)");
    }
    return new Limits(setting, rated, lowest);
  }

  private Optional<ReliefSetting> setting(double ambientPaAbsolute) {
    if (relief == null) {
      if (tolerancePa != null) {
        throw new BadInputException("--tolerance: give the setting it belongs to with --relief");
      }
      return Optional.empty();
    }
    double set = relief.gaugePa(ambientPaAbsolute);
    if (!(set > 0)) {
      throw new BadInputException("--relief: write a setting above zero gauge");
    }
    if (tolerancePa == null) {
      return Optional.of(ReliefSetting.iso4126(set));
    }
    if (tolerancePa >= set) {
      throw new BadInputException("--tolerance: it is as wide as the setting; check both");
    }
    return Optional.of(ReliefSetting.stated(set, tolerancePa));
  }

  private static OptionalDouble gauge(Pressure pressure, double ambientPaAbsolute) {
    return pressure == null
        ? OptionalDouble.empty()
        : OptionalDouble.of(pressure.gaugePa(ambientPaAbsolute));
  }
}

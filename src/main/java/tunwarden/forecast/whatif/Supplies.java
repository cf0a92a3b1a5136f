package tunwarden.forecast.whatif;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.Words;
import tunwarden.forecast.World;
import tunwarden.forecast.relief.SupplyFailure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects.Supply;
import tunwarden.vessel.ReliefSetting;

/** The supply regulator fails open. */
public final class Supplies {
  /** What the times and the pressure assume, in words. */
  public static final String ASSUMES =
      "regulator open all the way, nothing lets gas out, the liquid takes none up meanwhile";

  /** Opening, coefficient and the supply's own sag, relative, 95 %: judgement. */
  private static final double FLOW_U95 = 0.1;

  private Supplies() {}

  static Optional<WhatIf> failedOpen(Ensemble ensemble) {
    Present present = ensemble.present();
    return present
        .vessel()
        .prospects()
        .supply()
        .filter(supply -> supply.paGauge() > present.pressurePaGauge())
        .map(supply -> failedOpen(ensemble, supply));
  }

  private static WhatIf failedOpen(Ensemble ensemble, Supply supply) {
    Limits limits = ensemble.present().vessel().limits();
    Optional<TimeRange> toLift =
        limits
            .relief()
            .map(ReliefSetting::earliestLiftPaGauge)
            .filter(lift -> lift < supply.paGauge())
            .flatMap(lift -> time(ensemble, supply, lift))
            .map(Supplies::range);
    return new WhatIf(
        WhatIf.Kind.SUPPLY,
        "supply fails open",
        Optional.of(new Spread(supply.paGauge(), supply.paGauge(), supply.paGauge())),
        toLift,
        detail(ensemble, supply),
        ASSUMES,
        cautions(limits, supply));
  }

  private static String detail(Ensemble ensemble, Supply supply) {
    List<String> parts = new ArrayList<>();
    Limits limits = ensemble.present().vessel().limits();
    limits
        .relief()
        .ifPresent(relief -> add(parts, ensemble, supply, relief.setPaGauge(), "the setting"));
    if (limits.vesselPaGauge().isPresent()) {
      add(parts, ensemble, supply, limits.vesselPaGauge().getAsDouble(), "the vessel limit");
    }
    if (parts.isEmpty() && supply.seat().isEmpty() && supply.kgPerS().isEmpty()) {
      return "how soon is not known: state its orifice or its flow";
    }
    if (parts.isEmpty()) {
      add(parts, ensemble, supply, (ensemble.middle().paGauge() + supply.paGauge()) / 2, "");
    }
    return String.join(", ", parts);
  }

  private static void add(
      List<String> parts, Ensemble ensemble, Supply supply, double paGauge, String what) {
    if (!(paGauge < supply.paGauge())) {
      return;
    }
    String name = what.isEmpty() ? Words.gauge(paGauge) : what + " of " + Words.gauge(paGauge);
    time(ensemble, supply, paGauge)
        .ifPresent(s -> parts.add(name + " in " + Words.time(s.middle())));
  }

  /** What to mind of it. */
  public static List<Caution> cautions(Limits limits, Supply supply) {
    boolean bursts = supply.paGauge() > limits.vesselPaGauge().orElse(Double.MAX_VALUE);
    boolean lifts =
        limits.relief().stream().anyMatch(r -> supply.paGauge() >= r.earliestLiftPaGauge());
    return bursts || lifts
        ? List.of(
            new Caution(
                true,
                "Shut the supply at its source first; the relief valve must pass all of it, and"
                    + " nobody stays near its outlet."))
        : List.of();
  }

  /**
   * Time until a pressure is reached, s; empty where neither opening nor flow is known.
   *
   * @param ensemble the vessel
   * @param supply what fails
   * @param paGauge pressure to reach, Pa gauge, below that of the supply
   */
  public static Optional<Spread> time(Ensemble ensemble, Supply supply, double paGauge) {
    if (supply.seat().isEmpty() && supply.kgPerS().isEmpty()) {
      return Optional.empty();
    }
    Spread seconds = ensemble.range(world -> seconds(world, supply, paGauge));
    double own = FLOW_U95 * seconds.middle();
    return Optional.of(
        new Spread(
            Math.max(0, seconds.middle() - Math.hypot(seconds.middle() - seconds.low(), own)),
            seconds.middle(),
            seconds.middle() + Math.hypot(seconds.high() - seconds.middle(), own)));
  }

  private static double seconds(World world, Supply supply, double paGauge) {
    Present present = world.present();
    SupplyFailure failure =
        new SupplyFailure(
            supply.paGauge() + world.ambientPa(),
            supply.seat(),
            supply.kgPerS(),
            present.vessel().gas(),
            world.temperatureK());
    return failure.seconds(
        world.headspaceM3(), world.paGauge() + world.ambientPa(), paGauge + world.ambientPa());
  }

  private static TimeRange range(Spread seconds) {
    return new TimeRange(
        duration(seconds.middle()), duration(seconds.low()), Optional.of(duration(seconds.high())));
  }

  private static Duration duration(double seconds) {
    return Duration.ofMillis(Math.round(1000 * Math.min(seconds, 1e9)));
  }
}

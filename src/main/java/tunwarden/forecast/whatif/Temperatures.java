package tunwarden.forecast.whatif;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Forecaster;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.forecast.Projection;
import tunwarden.forecast.Scenario;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.WarmUp;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.Words;
import tunwarden.forecast.World;
import tunwarden.units.Constants;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** Warmed, cooled, and warmed until no headspace is left. */
final class Temperatures {
  private static final double HOTTEST_K = 60 + Constants.ZERO_CELSIUS_K;

  private Temperatures() {}

  static Optional<WhatIf> warmed(
      Ensemble ensemble, Outlook outlook, Optional<WarmingTime> warming) {
    return outlook
        .projection(Scenario.WARM)
        .map(
            warm ->
                new WhatIf(
                    WhatIf.Kind.WARM,
                    warm.words(),
                    Optional.of(spread(warm)),
                    warming.flatMap(time -> toLift(ensemble, time)),
                    warming
                        .map(WarmingTime::words)
                        .orElse("how soon is not known: no time constant is stated or learnt yet"),
                    "shut, cooling lost now; at the end at rest with the air about it",
                    liftCaution(ensemble.present(), warm)));
  }

  private static Optional<TimeRange> toLift(Ensemble ensemble, WarmingTime warming) {
    Present present = ensemble.present();
    double toK = present.vessel().warmToK().orElseThrow();
    return present
        .vessel()
        .limits()
        .relief()
        .map(ReliefSetting::earliestLiftPaGauge)
        .flatMap(
            lift ->
                WarmUp.until(
                    ensemble.middle(),
                    toK,
                    warming.timeS(),
                    lift,
                    present.activity().transferPerS()));
  }

  private static List<Caution> liftCaution(Present present, Projection warm) {
    boolean lifts =
        present.vessel().limits().relief().stream()
            .anyMatch(relief -> warm.highPaGauge() >= relief.earliestLiftPaGauge());
    return lifts
        ? List.of(
            new Caution(
                true, "Keep it cold or let it down first; never block or reset the relief valve."))
        : List.of();
  }

  static Optional<WhatIf> cooled(Ensemble ensemble, Outlook outlook) {
    return outlook.projection(Scenario.CHILL).map(cold -> cooled(ensemble.present(), cold));
  }

  private static WhatIf cooled(Present present, Projection cold) {
    double limit = present.vessel().limits().vacuumOrNonePaGauge();
    double margin = cold.paGauge() - limit;
    double u95 = Math.max(cold.highPaGauge() - cold.paGauge(), cold.paGauge() - cold.lowPaGauge());
    String side = margin >= 0 ? " above " : " below ";
    return new WhatIf(
        WhatIf.Kind.CHILL,
        cold.words(),
        Optional.of(spread(cold)),
        Optional.empty(),
        Words.bar(Math.abs(margin)).replace(" bar", "")
            + " ± "
            + Words.bar(u95)
            + side
            + Vacuums.limitWords(present),
        "shut, at rest at that temperature",
        cold.lowPaGauge() < limit ? List.of(Vacuums.COLLAPSE) : List.of());
  }

  static Optional<WhatIf> full(Ensemble ensemble, Outlook outlook) {
    if (outlook.liquidFullK().isEmpty()) {
      return Optional.empty();
    }
    ToDoubleFunction<World> fullK = world -> Forecaster.liquidFullK(world).orElse(HOTTEST_K);
    Spread at = ensemble.range(fullK);
    return Optional.of(
        new WhatIf(
            WhatIf.Kind.FULL,
            "full of liquid",
            Optional.empty(),
            Optional.empty(),
            "from "
                + Words.celsius(at.middle())
                + " on ("
                + Display.number(at.low() - Constants.ZERO_CELSIUS_K, 1)
                + " to "
                + Words.celsius(Math.min(at.high(), HOTTEST_K))
                + ") no headspace is left",
            "as filled; the shell's own growth is left out",
            List.of(
                new Caution(
                    true,
                    "Past it the pressure rises by bars per degree, and a relief valve passes"
                        + " liquid: draw some off first."))));
  }

  private static Spread spread(Projection projection) {
    return new Spread(projection.lowPaGauge(), projection.paGauge(), projection.highPaGauge());
  }
}

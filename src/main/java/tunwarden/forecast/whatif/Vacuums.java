package tunwarden.forecast.whatif;

import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.forecast.Scenario;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.Words;
import tunwarden.forecast.World;
import tunwarden.units.Display;

/** What takes pressure away: venting, drawing off with no gas let in, caustic. */
final class Vacuums {
  static final Caution COLLAPSE =
      new Caution(true, "Let gas in meanwhile: a thin wall collapses under a small vacuum.");

  private static final double L_PER_M3 = 1000;
  private static final double PERCENT = 100;

  private Vacuums() {}

  static Optional<WhatIf> vented(Outlook outlook) {
    return outlook
        .projection(Scenario.REBOUND)
        .map(
            back ->
                new WhatIf(
                    WhatIf.Kind.REBOUND,
                    back.words(),
                    Optional.of(new Spread(back.lowPaGauge(), back.paGauge(), back.highPaGauge())),
                    Optional.empty(),
                    "what leaves, foam and the room's air: vent bench",
                    "shut right after the vent, at the same temperature, at rest",
                    List.of()));
  }

  /** All of the liquid drawn off, and how much of it already reaches the vacuum limit. */
  static Optional<WhatIf> drawnOff(Ensemble ensemble) {
    Present present = ensemble.present();
    double limit = present.vessel().limits().vacuumOrNonePaGauge();
    Spread[] at =
        ensemble.ranges(
            world -> new double[] {world.drawnPaGauge(world.liquidM3()), drawnToM3(world, limit)});
    String already =
        at[1].middle() <= 0
            ? "it is at " + limitWords(present) + " already"
            : at[1].middle() < ensemble.middle().liquidM3()
                ? Display.number(L_PER_M3 * at[1].middle(), 0)
                    + " L ("
                    + Words.ends(at[1], L_PER_M3, 0)
                    + ") already reach "
                    + limitWords(present)
                : "stays above " + limitWords(present);
    boolean breached = at[0].low() < limit;
    return Optional.of(
        new WhatIf(
            WhatIf.Kind.DRAW,
            "drawn off, no gas let in",
            Optional.of(at[0]),
            Optional.empty(),
            already,
            "all of the liquid, so quickly that it gives off no gas meanwhile",
            breached ? List.of(COLLAPSE) : List.of()));
  }

  private static double drawnToM3(World world, double limitPaGauge) {
    if (world.paGauge() <= limitPaGauge) {
      return 0;
    }
    // the gauge falls from p to q over the whole liquid as 1/(headspace + drawn)
    double all = world.liquidM3();
    double whole = world.headspaceM3();
    double from = world.paGauge();
    double to = world.drawnPaGauge(all);
    double dry = (from - to) * (whole + all) / all;
    double rest = from - dry;
    return whole * (dry / (limitPaGauge - rest) - 1);
  }

  /** Caustic has bound all CO2 of the headspace, and what share already reaches the limit. */
  static Optional<WhatIf> caustic(Ensemble ensemble) {
    Present present = ensemble.present();
    double limit = present.vessel().limits().vacuumOrNonePaGauge();
    Spread[] at =
        ensemble.ranges(
            world -> {
              double bound = world.causticPaGauge(1);
              double share = (world.paGauge() - limit) / (world.paGauge() - bound);
              return new double[] {bound, Math.max(0, share)};
            });
    String already =
        at[1].middle() <= 0
            ? "it is at " + limitWords(present) + " already"
            : Display.number(PERCENT * at[1].middle(), 0)
                + " % of it already reaches "
                + limitWords(present);
    return at[0].middle() >= limit
        ? Optional.empty()
        : Optional.of(
            new WhatIf(
                WhatIf.Kind.CAUSTIC,
                "caustic binds its CO2",
                Optional.of(at[0]),
                Optional.empty(),
                already,
                "all CO2 of the headspace as it is now, no gas let in, the liquid apart",
                List.of(COLLAPSE)));
  }

  /** "the vacuum limit of -0.02 bar g", or that none was stated. */
  static String limitWords(Present present) {
    boolean stated = present.vessel().limits().vacuumPaGauge().isPresent();
    String limit = Words.gauge(present.vessel().limits().vacuumOrNonePaGauge());
    return stated ? "the vacuum limit of " + limit : limit + " (no vacuum is allowed for)";
  }
}

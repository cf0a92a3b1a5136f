package tunwarden.forecast;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.vacuum.LiquidFull;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.vessel.Limits;

/** What to mind before acting, said only where the numbers call for it. */
final class Cautions {
  private static final double FOAMING = 0.5;
  private static final double THIN_SHELL = 400;
  private static final double STOUT_SHELL = 100;
  private static final double NEAR_FULL_K = 15;
  private static final double BAR = 1e5;
  private static final double HOUR_S = 3600;

  private final Present present;
  private final List<Caution> list = new ArrayList<>();

  Cautions(Present present) {
    this.present = present;
  }

  List<Caution> list() {
    return list;
  }

  private Limits limits() {
    return present.vessel().limits();
  }

  /** Cooling lost. */
  void warm(double toK, Spread paGauge, OptionalDouble unmixedPaGauge) {
    double highest = Math.max(paGauge.high(), unmixedPaGauge.orElse(paGauge.high()));
    limits()
        .relief()
        .filter(relief -> highest >= relief.earliestLiftPaGauge())
        .ifPresent(
            relief ->
                list.add(
                    new Caution(
                        true,
                        "Warmed to "
                            + Words.celsius(toK)
                            + " it may reach "
                            + Words.gauge(highest)
                            + ", above the valve's earliest opening at "
                            + Words.gauge(relief.earliestLiftPaGauge())
                            + ": keep it cold or let it down first, and never block or reset the"
                            + " valve.")));
  }

  /** Cooled while shut. */
  void chill(double toK, Spread paGauge) {
    double least = limits().vacuumOrNonePaGauge();
    if (paGauge.low() < least) {
      list.add(
          new Caution(
              true,
              "Cooled shut to "
                  + Words.celsius(toK)
                  + " it may fall to "
                  + Words.gauge(paGauge.low())
                  + ", below the vacuum limit of "
                  + Words.gauge(least)
                  + ": let gas in while cooling, a thin wall collapses under a small vacuum."));
    }
  }

  /** No headspace left. */
  void liquidFull(OptionalDouble fullK) {
    double warmest =
        Math.max(present.temperatureK() + NEAR_FULL_K, present.vessel().warmToK().orElse(0));
    if (fullK.isEmpty() || fullK.getAsDouble() > warmest) {
      return;
    }
    LiquidFull full = fullAt(fullK.getAsDouble());
    list.add(
        new Caution(
            true,
            String.format(
                Locale.ROOT,
                "At %s the liquid fills the vessel; from there a steel shell gains about %.1f to"
                    + " %.1f bar per °C, and a relief valve passes liquid: draw some off first.",
                Words.celsius(fullK.getAsDouble()),
                full.risePaPerK(THIN_SHELL) / BAR,
                full.risePaPerK(STOUT_SHELL) / BAR)));
  }

  private LiquidFull fullAt(double kelvin) {
    LiquidDensity density = LiquidDensity.of(present.vessel().liquid());
    double expansion = Math.log(density.kgPerM3(kelvin - 0.5) / density.kgPerM3(kelvin + 0.5));
    return new LiquidFull(expansion, Kell1975.compressibilityPerPa(kelvin));
  }

  /** More gas in the liquid than the present pressure holds. */
  void supersaturation(World world) {
    double rest = world.equilibriumKgPerM3(present.pressurePaAbsolute());
    double excess = world.dissolvedKgPerM3() / rest - 1;
    if (excess > FOAMING) {
      list.add(
          new Caution(
              false,
              Math.round(100 * excess)
                  + " % more gas in the liquid than it holds at rest: it foams when moved or"
                  + " vented, and foam blocks vents and valves."));
    }
  }

  /** The gauge rises faster than the estimator can explain. */
  void contradiction(boolean isThere, double paPerS) {
    if (isThere) {
      list.add(
          new Caution(
              false,
              String.format(
                  Locale.ROOT,
                  "It rises by %.3f bar an hour, faster than the estimate explains (gas being"
                      + " made, a supply?): the trend follows the gauge.",
                  paPerS * HOUR_S / BAR)));
    }
  }

  /** The trend's upper edge reaches the valve although the trend itself does not. */
  void soonest(Optional<TimeRange> likely, Optional<Duration> soonest) {
    if (likely.isEmpty() && soonest.isPresent()) {
      list.add(
          new Caution(
              false,
              "At the upper edge of its range the pressure reaches the valve in "
                  + Math.max(1, soonest.get().toHours())
                  + " h."));
    }
  }
}

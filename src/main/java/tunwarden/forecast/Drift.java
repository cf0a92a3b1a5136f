package tunwarden.forecast;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.Mode;

/**
 * Where pressure goes by itself at the present temperature: it nears the pressure of rest at the
 * rate kLa (1 + capacity of the liquid over that of the headspace), and gas being made lifts that
 * rest steadily. Held pressure stays where it is. The band takes the ends of rest and rate
 * together.
 */
final class Drift {
  /** How far ahead the trend is run. */
  static final Duration HORIZON = Duration.ofHours(48);

  private static final Duration STEP = Duration.ofMinutes(30);

  private final Present present;
  private final Curve middle;
  private final Curve low;
  private final Curve high;

  /** Pressure over time: towards a rest that itself rises steadily. */
  private record Curve(double startPa, double restPa, double ratePerS, double risePaPerS) {
    double at(double seconds) {
      double near = -Math.expm1(-ratePerS * seconds);
      // the rise is first felt by the liquid, then by the gauge: late by one relaxation time
      double lag = ratePerS > 0 ? near / ratePerS : seconds;
      return startPa + (restPa - startPa) * near + risePaPerS * (seconds - lag);
    }
  }

  private Drift(Present present, Curve middle, Curve low, Curve high) {
    this.present = present;
    this.middle = middle;
    this.low = low;
    this.high = high;
  }

  /**
   * The drift of a vessel.
   *
   * @param ensemble the vessel
   * @param rest its pressure once at rest at the present temperature, Pa gauge
   */
  static Drift of(Ensemble ensemble, Spread rest) {
    Present present = ensemble.present();
    double now = present.pressurePaGauge();
    double accuracy = present.vessel().accuracy().pressureU95Pa();
    if (present.activity().mode() == Mode.HELD) {
      return new Drift(present, flat(now), flat(now - accuracy), flat(now + accuracy));
    }
    World world = ensemble.middle();
    double faster = 1 + world.capacityRatio();
    double rise = rise(world, present.activity().gasMadeKgPerM3PerS());
    Spread transfer = present.activity().transferPerS();
    boolean climbing = rest.middle() >= now;
    double soon = transfer.high() * faster;
    double late = transfer.low() * faster;
    return new Drift(
        present,
        new Curve(now, rest.middle(), transfer.middle() * faster, rise),
        new Curve(now - accuracy, rest.low(), climbing ? late : soon, 0.5 * rise),
        new Curve(now + accuracy, rest.high(), climbing ? soon : late, 2 * rise));
  }

  private static Curve flat(double pa) {
    return new Curve(pa, pa, 0, 0);
  }

  /** Pa/s by which gas being made lifts the pressure of rest. */
  private static double rise(World world, double madeKgPerM3PerS) {
    if (!(madeKgPerM3PerS > 0)) {
      return 0;
    }
    double portion = 0.1; // kg/m³, a small part of what any drink holds
    double temperature = world.temperatureK();
    double lifted = world.restPaGauge(temperature, portion) - world.restPaGauge(temperature);
    return lifted / portion * madeKgPerM3PerS;
  }

  /** Pressure after a time with its band, Pa gauge. */
  Spread at(Duration after) {
    double seconds = after.toSeconds();
    double centre = middle.at(seconds);
    return new Spread(
        Math.min(centre, low.at(seconds)), centre, Math.max(centre, high.at(seconds)));
  }

  /** The chart's points. */
  List<TrendPoint> points() {
    List<TrendPoint> points = new ArrayList<>();
    for (Duration t = Duration.ZERO; t.compareTo(HORIZON) <= 0; t = t.plus(STEP)) {
      Spread pa = at(t);
      points.add(new TrendPoint(present.at().plus(t), pa.middle(), pa.low(), pa.high()));
    }
    return points;
  }

  /** Time until a pressure is reached from below; empty: not even at the band's upper edge. */
  Optional<TimeRange> until(double paGauge) {
    Optional<Duration> first = crossing(high, paGauge);
    Optional<Duration> likely = crossing(middle, paGauge);
    if (first.isEmpty() || likely.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(new TimeRange(likely.get(), first.get(), crossing(low, paGauge)));
  }

  /** Time until the band's upper edge reaches a pressure. */
  Optional<Duration> soonest(double paGauge) {
    return crossing(high, paGauge);
  }

  private static Optional<Duration> crossing(Curve curve, double paGauge) {
    if (curve.at(0) >= paGauge) {
      return Optional.of(Duration.ZERO);
    }
    double end = HORIZON.toSeconds();
    double step = STEP.toSeconds();
    for (double t = step; t <= end; t += step) {
      if (curve.at(t) >= paGauge) {
        return Optional.of(Duration.ofSeconds(Math.round(within(curve, paGauge, t - step, t))));
      }
    }
    return Optional.empty();
  }

  private static double within(Curve curve, double paGauge, double from, double to) {
    double low = from;
    double high = to;
    while (high - low > 1) {
      double middle = (low + high) / 2;
      if (curve.at(middle) >= paGauge) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }
}

package tunwarden.forecast;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.ForwardPoint;
import tunwarden.estimate.Mode;

/**
 * The trend of a vessel of which only an estimate is known, no estimator's state: at the present
 * temperature it nears the pressure of rest at the rate kLa (1 + capacity of the liquid over that
 * of the headspace), and gas being made lifts that rest steadily. Held pressure stays where it is.
 * The band takes the ends of rest and rate together, so it is wider than the estimator's own
 * forward run, which is used wherever there is one.
 */
final class Drift {
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

  private Drift(Curve middle, Curve low, Curve high) {
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
  static List<ForwardPoint> run(Ensemble ensemble, Spread rest) {
    Present present = ensemble.present();
    double now = present.pressurePaGauge();
    double accuracy = present.vessel().accuracy().pressureU95Pa();
    if (present.activity().mode() == Mode.HELD) {
      return new Drift(flat(now), flat(now - accuracy), flat(now + accuracy)).run();
    }
    World world = ensemble.middle();
    double faster = 1 + world.capacityRatio();
    double rise = rise(world, present.activity().gasMadeKgPerM3PerS());
    Spread transfer = present.activity().transferPerS();
    boolean climbing = rest.middle() >= now;
    double soon = transfer.high() * faster;
    double late = transfer.low() * faster;
    return new Drift(
            new Curve(now, rest.middle(), transfer.middle() * faster, rise),
            new Curve(now - accuracy, rest.low(), climbing ? late : soon, 0.5 * rise),
            new Curve(now + accuracy, rest.high(), climbing ? soon : late, 2 * rise))
        .run();
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

  /** The run of points. */
  private List<ForwardPoint> run() {
    List<ForwardPoint> points = new ArrayList<>();
    for (Duration t = Duration.ZERO; t.compareTo(Trend.HORIZON) <= 0; t = t.plus(Trend.STEP)) {
      double seconds = t.toSeconds();
      double centre = middle.at(seconds);
      points.add(
          new ForwardPoint(
              t, centre, Math.min(centre, low.at(seconds)), Math.max(centre, high.at(seconds))));
    }
    return points;
  }
}

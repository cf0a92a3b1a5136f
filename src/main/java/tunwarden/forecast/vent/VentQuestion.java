package tunwarden.forecast.vent;

import java.util.Optional;
import tunwarden.forecast.Present;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Room;

/**
 * A vent somebody thinks of.
 *
 * @param toPaGauge pressure to let the vessel down to, Pa gauge
 * @param path what the gas leaves through, if known
 * @param room the room it goes into, if known
 * @param foamBound highest supersaturation wanted, above 0
 */
public record VentQuestion(
    double toPaGauge, Optional<ReliefOrifice> path, Optional<Room> room, double foamBound) {
  /** Fobbing on movement or venting becomes likely: a working threshold, from memory. */
  public static final double USUAL_BOUND = 0.5;

  /** What is wrong with the question, as one sentence; empty when it can be answered. */
  public Optional<String> fault(Present present) {
    if (!(toPaGauge <= present.pressurePaGauge())) {
      return Optional.of(
          "the vent target of "
              + Display.METRIC.gauge(toPaGauge)
              + " is above the present pressure of "
              + Display.METRIC.gauge(present.pressurePaGauge())
              + "; write a lower one");
    }
    if (!(toPaGauge >= 0)) {
      return Optional.of("a vent to the room ends at 0 bar g; write 0 bar or more");
    }
    if (!(foamBound > 0)) {
      return Optional.of("the supersaturation bound must be above 0 %");
    }
    return path.flatMap(hole -> OrificeFit.fault(hole.diameterM(), present.vessel().volumeM3()));
  }
}

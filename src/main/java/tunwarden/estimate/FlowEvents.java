package tunwarden.estimate;

import java.util.Locale;
import tunwarden.estimate.Front.Flow;
import tunwarden.estimate.Front.Point;
import tunwarden.estimate.bank.Noise;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Names a flow that has ended: vent, lift or charge. */
final class FlowEvents {
  private static final double NEAR_SHARE = 0.02;
  private static final double LONGEST_LEAD_S = 45;

  private FlowEvents() {}

  static Event name(Vessel vessel, Flow flow, double gasKg, Noise noise) {
    double from = flow.begin().paGauge();
    double to = flow.moving().paGauge();
    EventKind kind = kind(vessel, from, to, noise);
    double size = Math.abs(to - from);
    double confidence = Math.min(0.99, 1 - Math.exp(-size / (8 * noise.sd() + 200)));
    return new Event(
        kind,
        vessel.id(),
        BankEstimator.instant(begin(flow)),
        BankEstimator.instant(flow.moving().atS()),
        false,
        from,
        to,
        gasKg,
        confidence,
        why(kind, from, to, flow));
  }

  private static double begin(Flow flow) {
    Point a = flow.begin();
    double lead = Math.min((flow.first().atS() - a.atS()) / 2, LONGEST_LEAD_S);
    return flow.first().atS() - lead;
  }

  private static EventKind kind(Vessel vessel, double from, double to, Noise noise) {
    if (to > from) {
      return EventKind.CHARGE;
    }
    if (vessel.limits().relief().isEmpty()) {
      return EventKind.VENT;
    }
    ReliefSetting relief = vessel.limits().relief().get();
    double near =
        relief.earliestLiftPaGauge()
            - NEAR_SHARE * relief.setPaGauge()
            - 3 * noise.sd()
            - vessel.accuracy().pressureU95Pa();
    boolean shutsAgain = to > 0.5 * from;
    return from >= near && shutsAgain ? EventKind.LIFT : EventKind.VENT;
  }

  private static String why(EventKind kind, double from, double to, Flow flow) {
    double seconds = flow.moving().atS() - begin(flow);
    String course =
        String.format(Locale.ROOT, "%.3f to %.3f bar g in %.0f s", from / 1e5, to / 1e5, seconds);
    return switch (kind) {
      case CHARGE -> "pressure rose from " + course + ", faster than the liquid can give gas";
      case LIFT -> "pressure fell from " + course + ", starting where the valve may open";
      default -> "pressure fell from " + course + ", faster than the liquid can take gas";
    };
  }
}

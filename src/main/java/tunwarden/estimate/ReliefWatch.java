package tunwarden.estimate;

import java.util.List;
import java.util.Locale;
import tunwarden.estimate.Front.Point;
import tunwarden.estimate.bank.Noise;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Notices a pressure above the relief set pressure that no lift brings down. */
final class ReliefWatch {
  private ReliefWatch() {}

  static EventBook look(Vessel vessel, EventBook book, Point point, Noise noise, List<Event> news) {
    if (vessel.limits().relief().isEmpty()) {
      return book;
    }
    ReliefSetting relief = vessel.limits().relief().get();
    double certain = vessel.accuracy().pressureU95Pa() + 2 * noise.sd();
    boolean above = point.paGauge() > relief.setPaGauge() + certain;
    boolean known = book.has(EventKind.OVER_RELIEF);
    if (above && !known) {
      String why =
          String.format(
              Locale.ROOT,
              "%.2f bar g is above the relief set pressure of %.2f bar g, with no lift seen",
              point.paGauge() / 1e5,
              relief.setPaGauge() / 1e5);
      return book.put(event(vessel, point, why), news);
    }
    if (known && point.paGauge() < relief.setPaGauge()) {
      return book.close(
          EventKind.OVER_RELIEF, BankEstimator.instant(point.atS()), point.paGauge(), news);
    }
    return book;
  }

  private static Event event(Vessel vessel, Point point, String why) {
    return new Event(
        EventKind.OVER_RELIEF,
        vessel.id(),
        BankEstimator.instant(point.atS()),
        BankEstimator.instant(point.atS()),
        true,
        point.paGauge(),
        point.paGauge(),
        0,
        0.95,
        why);
  }
}

package tunwarden.estimate;

import java.util.List;
import java.util.Locale;
import tunwarden.estimate.Front.Point;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.Grid;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.bank.Reader;

/** Notices a slow loss, and a pressure that nothing explains. */
final class LossWatch {
  private static final double CERTAIN = 0.9;
  private static final double PATIENCE_S = 1800;
  private static final double LEAST_FALL_PA_PER_HOUR = 200;
  private static final double STRAIN = 3.0;
  private static final double STRAIN_S = 3600;
  private static final double AFRESH_S = 750;

  private final Medium medium;
  private final Bank before;
  private final Bank bank;
  private Watch watch;
  private EventBook book;

  LossWatch(Medium medium, Bank before, Bank bank, Watch watch, EventBook book) {
    this.medium = medium;
    this.before = before;
    this.bank = bank;
    this.watch = watch;
    this.book = book;
  }

  Watch watch() {
    return watch;
  }

  EventBook book() {
    return book;
  }

  void look(Point point, double sinceS, List<Event> news) {
    double dt = point.atS() - sinceS;
    leak(point, dt, news);
    strain(point, dt, news);
  }

  private void leak(Point point, double dt, List<Event> news) {
    if (bank.modeWeight(Grid.LEAKING) < CERTAIN) {
      book = book.close(EventKind.LEAK, BankEstimator.instant(point.atS()), point.paGauge(), news);
      watch = watch.withLoss(0, 0);
      return;
    }
    double rate = -new Reader(medium).read(bank).made();
    double lasted = watch.lossS() + dt;
    double lost = watch.lostKgPerM3() + Math.max(0, rate) * dt;
    watch = watch.withLoss(lasted, lost);
    if (lasted < PATIENCE_S || fallPaPerHour(rate) < LEAST_FALL_PA_PER_HOUR) {
      return;
    }
    double kg = lost * medium.fillM3();
    if (!book.has(EventKind.LEAK)) {
      book = book.put(event(EventKind.LEAK, point, lasted, kg, leakWords(rate)), news);
    } else {
      List<Event> silent = new java.util.ArrayList<>();
      Event old = book.open().get(EventKind.LEAK);
      book =
          book.put(event(EventKind.LEAK, point, point.atS() - startS(old), kg, old.why()), silent);
    }
  }

  /** How fast the pressure of a vessel at rest falls by such a loss. */
  private double fallPaPerHour(double rate) {
    Bank.Setting s = bank.setting();
    double perPa =
        medium.solubility(s.kelvin(), s.paAbsolute())
            + medium.headspace(s.kelvin(), s.paAbsolute(), s.fillKelvin());
    return 3600 * rate / perPa;
  }

  private static double startS(Event event) {
    return BankEstimator.seconds(event.time());
  }

  private String leakWords(double rate) {
    return String.format(
        Locale.ROOT,
        "pressure falls as by a steady loss of %.3g g an hour, which the closed vessel cannot show",
        1000 * 3600 * rate * medium.fillM3());
  }

  private void strain(Point point, double dt, List<Event> news) {
    double lasted = strained(dt);
    watch = watch.withStrain(Math.min(lasted, 2 * STRAIN_S));
    if (lasted > STRAIN_S && !book.has(EventKind.UNEXPLAINED)) {
      String why = "for an hour the pressure has gone where no dissolved gas would take it";
      book = book.put(event(EventKind.UNEXPLAINED, point, lasted, 0, why), news);
    } else if (lasted <= 0) {
      book =
          book.close(
              EventKind.UNEXPLAINED, BankEstimator.instant(point.atS()), point.paGauge(), news);
    }
  }

  /** A bank that has started afresh and again has nothing that fits counts as long strain. */
  private double strained(double dt) {
    if (before.hasLostTrack()) {
      return watch.strainS() + AFRESH_S;
    }
    boolean strained = Math.abs(bank.setting().drift()) > STRAIN;
    return strained ? watch.strainS() + dt : Math.max(0, watch.strainS() - 0.5 * dt);
  }

  private Event event(EventKind kind, Point point, double lasted, double kg, String why) {
    return new Event(
        kind,
        medium.vessel().id(),
        BankEstimator.instant(point.atS() - lasted),
        BankEstimator.instant(point.atS()),
        true,
        point.paGauge(),
        point.paGauge(),
        kg,
        kind == EventKind.LEAK ? bank.modeWeight(Grid.LEAKING) : 0.6,
        why);
  }
}

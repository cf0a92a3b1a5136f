package tunwarden.estimate;

import java.util.Locale;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.BankFilter;
import tunwarden.estimate.bank.Experiment;
import tunwarden.estimate.bank.Grid;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.bank.Noise;
import tunwarden.estimate.bank.Reader;
import tunwarden.estimate.bank.Summary;

/** Says what the readings cannot tell at present, and which short experiment would help. */
final class Ignorance {
  /** How often the words are worked out anew, s. */
  static final double EVERY_S = 600;

  private static final double WIDE = 0.08;
  private static final double WORTH = 0.7;
  private static final int[] MINUTES = {5, 15, 60, 240};

  private Ignorance() {}

  static String words(Medium medium, Bank bank, Noise noise) {
    Summary now = new Reader(medium).read(bank);
    if (now.dissolvedU95() < WIDE * now.dissolved()) {
      return "";
    }
    double held = bank.modeWeight(Grid.HELD);
    String range =
        String.format(
            Locale.ROOT,
            "%.1f to %.1f g/L",
            Math.max(0, now.dissolved() - now.dissolvedU95()),
            now.dissolved() + now.dissolvedU95());
    String lead;
    if (held > 0.65) {
      lead =
          "Pressure is held from outside and carries no news of the liquid, which may hold "
              + range
              + ".";
    } else if (held > 0.1) {
      lead =
          "The readings fit a vessel that is held from outside as well as one at rest; the liquid"
              + " may hold "
              + range
              + ".";
    } else {
      lead = "The liquid is still finding its balance and may hold " + range + ".";
    }
    return lead + advice(medium, bank, noise, now, held > 0.1);
  }

  private static String advice(
      Medium medium, Bank bank, Noise noise, Summary now, boolean openNow) {
    BankFilter filter = new BankFilter(medium);
    for (int minutes : MINUTES) {
      double after = Experiment.closedFor(filter, bank, 60.0 * minutes, noise);
      boolean last = minutes == MINUTES[MINUTES.length - 1];
      if (after < WORTH * now.dissolvedU95() || last && after < 0.9 * now.dissolvedU95()) {
        String time = minutes < 60 ? minutes + " minutes" : minutes / 60 + " h";
        return String.format(
            Locale.ROOT,
            " %s for %s: ±%.2g becomes about ±%.2g g/L.",
            openNow ? "Close every valve" : "Leave it closed",
            time,
            now.dissolvedU95(),
            after);
      }
    }
    return " No closing of a few hours would narrow that much; a laboratory value would.";
  }
}

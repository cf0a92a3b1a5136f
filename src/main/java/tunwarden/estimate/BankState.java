package tunwarden.estimate;

import java.util.Optional;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.Medium;

/**
 * Memory of {@link BankEstimator}; immutable.
 *
 * @param medium the vessel's tables
 * @param senses the instruments
 * @param front the fast side; null before the first pair of readings
 * @param bank the filters; null before the first pair of readings
 * @param watch slow watches on temperature, relief and loss
 * @param book events that go on
 * @param estimate the present belief
 */
record BankState(
    Medium medium,
    Senses senses,
    Front front,
    Bank bank,
    Watch watch,
    EventBook book,
    Optional<Estimate> estimate)
    implements State {

  BankState withSenses(Senses other) {
    return new BankState(medium, other, front, bank, watch, book, estimate);
  }

  BankState withBook(EventBook other) {
    return new BankState(medium, senses, front, bank, watch, other, estimate);
  }

  BankState withWatch(Watch newWatch, EventBook newBook) {
    return new BankState(medium, senses, front, bank, newWatch, newBook, estimate);
  }

  /** Ambient pressure: by the barometer where there is one, else the site's. */
  double ambientPa() {
    return senses.barometer().seen()
        ? senses.barometer().value()
        : medium.vessel().site().ambientPaAbsolute();
  }
}

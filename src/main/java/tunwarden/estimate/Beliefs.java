package tunwarden.estimate;

import java.time.Instant;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.Grid;
import tunwarden.estimate.bank.Reader;
import tunwarden.estimate.bank.Summary;

/** Puts the bank's numbers into an {@link Estimate}. */
final class Beliefs {
  private Beliefs() {}

  static Estimate of(BankState state, Bank bank, Instant at, double paGauge, String said) {
    Summary s = new Reader(state.medium()).read(bank);
    double held = bank.modeWeight(Grid.HELD);
    boolean flowing = state.front() != null && state.front().flow() != null;
    Mode mode = held > 0.5 ? Mode.HELD : Mode.SEALED;
    double confidence = Math.max(held, 1 - held);
    if (flowing) {
      mode = Mode.FLOWING;
      confidence = 0.95;
    } else if (confidence < 0.65) {
      mode = Mode.UNKNOWN;
    }
    double larger = Math.max(Math.max(s.dissolved(), s.equilibrium()), 1e-6);
    double settled = 1 - Math.min(1, Math.abs(s.dissolved() - s.equilibrium()) / larger);
    double co2Share = state.medium().co2Share();
    double supplied = co2Share > 0 ? (1 - s.airFraction()) / co2Share : 1;
    return new Estimate(
        at,
        paGauge,
        state.senses().smoothK(),
        s.dissolved(),
        s.dissolvedU95(),
        s.equilibrium(),
        settled,
        Math.max(0, 1 - supplied),
        s.airU95(),
        mode,
        confidence,
        new Estimate.Spread(s.transfer()[0], s.transfer()[1], s.transfer()[2]),
        Math.max(0, s.made()),
        said);
  }

  /** The same belief carried to a newer reading between two moves of the bank. */
  static Estimate carried(Estimate old, Instant at, double paGauge, double kelvin) {
    return new Estimate(
        at,
        paGauge,
        kelvin,
        old.dissolvedKgPerM3(),
        old.dissolvedU95KgPerM3(),
        old.equilibriumKgPerM3(),
        old.settled(),
        old.airFraction(),
        old.airFractionU95(),
        old.mode(),
        old.modeConfidence(),
        old.transferPerS(),
        old.gasMadeKgPerM3PerS(),
        old.ignorance());
  }
}

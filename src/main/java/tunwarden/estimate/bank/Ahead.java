package tunwarden.estimate.bank;

import java.util.Arrays;

/** Runs a bank forward without readings, everything staying connected as it is. */
public final class Ahead {
  private static final double LEAST_WEIGHT = 2e-3;
  private static final double TAIL = 0.025;

  private final BankFilter filter;
  private final Bank bank;
  private final int[] kept;
  private final Gaussian[] filters;
  private final double[] row = new double[Gaussian.STATES];
  private final Motion motion = new Motion();

  /** Starts at the bank's own time. */
  public Ahead(BankFilter filter, Bank bank) {
    this.filter = filter;
    this.bank = bank;
    int[] all = new int[Grid.FILTERS];
    int n = 0;
    for (int f = 0; f < Grid.FILTERS; f++) {
      if (bank.weights[f] > LEAST_WEIGHT) {
        all[n++] = f;
      }
    }
    kept = Arrays.copyOf(all, n);
    filters = new Gaussian[n];
    for (int i = 0; i < n; i++) {
      filters[i] = new Gaussian();
      filters[i].load(bank.filters, kept[i] * Gaussian.STRIDE);
    }
  }

  /** Moves on by some seconds at a constant temperature. */
  public void advance(double seconds) {
    Passage way = filter.passage(bank.setting, bank.setting, seconds);
    for (int i = 0; i < kept.length; i++) {
      int mode = Grid.modeOf(kept[i]);
      if (mode == Grid.HELD) {
        motion.held(filters[i], Grid.transferPerS(kept[i]), way);
      } else {
        motion.sealed(filters[i], Grid.transferPerS(kept[i]), way);
      }
      BankFilter.disturb(filters[i], mode, way, 0);
    }
  }

  /** Dry absolute pressure now: 2.5, 50 and 97.5 % quantiles, Pa. */
  public double[] dryPressure() {
    Mixture mixture = new Mixture(kept.length);
    for (int i = 0; i < kept.length; i++) {
      double mean = BankFilter.predict(filters[i], Grid.modeOf(kept[i]), row);
      mixture.add(bank.weights[kept[i]], mean, filters[i].varianceOf(row));
    }
    return new double[] {mixture.quantile(TAIL), mixture.quantile(0.5), mixture.quantile(1 - TAIL)};
  }
}

package tunwarden.estimate.bank;

import java.util.Arrays;

/** Runs a bank forward without readings, everything staying connected as it is. */
public final class Ahead {
  private static final double LEAST_WEIGHT = 2e-3;

  private final BankFilter filter;
  private final Bank bank;
  private final int[] kept;
  private final Gaussian[] filters;
  private final double[] row = new double[Gaussian.STATES];
  private final Motion motion = new Motion();
  private Bank.Setting now;

  /** Starts at the bank's own time. */
  public Ahead(BankFilter filter, Bank bank) {
    this.filter = filter;
    this.bank = bank;
    this.now = bank.setting;
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

  /**
   * Moves on.
   *
   * @param seconds how long
   * @param kelvin liquid temperature then; it changes evenly until then
   * @param paAbsolute pressure about then, for the slopes of gas and solubility
   */
  public void advance(double seconds, double kelvin, double paAbsolute) {
    Bank.Setting next =
        new Bank.Setting(kelvin, paAbsolute, now.fillKelvin(), now.unmixedS(), now.drift());
    Passage way = filter.passage(now, next, seconds);
    double warmed = Math.abs(kelvin - now.kelvin());
    now = next;
    for (int i = 0; i < kept.length; i++) {
      int mode = Grid.modeOf(kept[i]);
      if (mode == Grid.HELD) {
        motion.held(filters[i], Grid.transferPerS(kept[i]), way);
      } else {
        motion.sealed(filters[i], Grid.transferPerS(kept[i]), way);
      }
      Disturbance.add(filters[i], mode, way, warmed);
    }
  }

  /** Dry absolute pressure now: the values below which these shares of the belief lie, Pa. */
  public double[] dryPressure(double... shares) {
    Mixture mixture = new Mixture(kept.length);
    for (int i = 0; i < kept.length; i++) {
      double mean = BankFilter.predict(filters[i], Grid.modeOf(kept[i]), row);
      mixture.add(bank.weights[kept[i]], mean, filters[i].varianceOf(row));
    }
    double[] pa = new double[shares.length];
    for (int i = 0; i < pa.length; i++) {
      pa[i] = mixture.quantile(shares[i]);
    }
    return pa;
  }
}

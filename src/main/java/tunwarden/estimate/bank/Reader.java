package tunwarden.estimate.bank;

/** Reads the mixture of a bank. */
public final class Reader {
  private static final double LEAST_WEIGHT = 1e-4;
  private static final int BISECTIONS = 30;
  private static final double COVER = 0.955;
  private static final double MODEL_SHARE = 0.004;

  private final Medium medium;

  /** Reads banks of one vessel. */
  public Reader(Medium medium) {
    this.medium = medium;
  }

  /** Boils the bank down. */
  public Summary read(Bank bank) {
    int n = 0;
    double[] w = new double[Grid.FILTERS];
    double[] mean = new double[Grid.FILTERS];
    double[] sd = new double[Grid.FILTERS];
    double low = Double.POSITIVE_INFINITY;
    double high = 0;
    double total = 0;
    for (int f = 0; f < Grid.FILTERS; f++) {
      if (bank.weights[f] > LEAST_WEIGHT) {
        w[n] = bank.weights[f];
        mean[n] = bank.mean(f, Gaussian.LIQUID);
        double own = MODEL_SHARE * mean[n];
        sd[n] = Math.sqrt(Math.max(bank.variance(f, Gaussian.LIQUID), 0) + own * own);
        low = Math.min(low, mean[n] - 5 * sd[n]);
        high = Math.max(high, mean[n] + 5 * sd[n]);
        total += w[n++];
      }
    }
    for (int i = 0; i < n; i++) {
      w[i] /= total;
    }
    double centre;
    double half;
    if (bank.modeWeight(Grid.HELD) > 0.5) {
      double a = Math.max(0, quantile(w, mean, sd, n, 0.0225, low, high));
      double b = quantile(w, mean, sd, n, 0.9775, low, high);
      centre = 0.5 * (a + b);
      half = 0.5 * (b - a);
    } else {
      centre = Math.max(0, quantile(w, mean, sd, n, 0.5, low, high));
      half = halfWidth(w, mean, sd, n, centre, high - low);
    }
    return finish(bank, centre, half);
  }

  private static double quantile(
      double[] w, double[] mean, double[] sd, int n, double p, double low, double high) {
    double a = low;
    double b = high;
    for (int i = 0; i < BISECTIONS; i++) {
      double c = 0.5 * (a + b);
      if (below(w, mean, sd, n, c) < p) {
        a = c;
      } else {
        b = c;
      }
    }
    return 0.5 * (a + b);
  }

  private static double halfWidth(
      double[] w, double[] mean, double[] sd, int n, double centre, double most) {
    double a = 0;
    double b = most;
    for (int i = 0; i < BISECTIONS; i++) {
      double c = 0.5 * (a + b);
      double inside = below(w, mean, sd, n, centre + c) - below(w, mean, sd, n, centre - c);
      if (inside < COVER) {
        a = c;
      } else {
        b = c;
      }
    }
    return b;
  }

  private static double below(double[] w, double[] mean, double[] sd, int n, double x) {
    double sum = 0;
    for (int i = 0; i < n; i++) {
      sum += w[i] * Normal.below((x - mean[i]) / sd[i]);
    }
    return sum;
  }

  private Summary finish(Bank bank, double centre, double half) {
    double air = 0;
    double air2 = 0;
    double rest = 0;
    double made = 0;
    double made2 = 0;
    Bank.Setting s = bank.setting;
    double slope =
        medium.solubility(s.kelvin(), s.paAbsolute())
            / medium.headspace(s.kelvin(), s.paAbsolute(), s.fillKelvin());
    for (int f = 0; f < Grid.FILTERS; f++) {
      double w = bank.weights[f];
      if (w < 1e-9) {
        continue;
      }
      double gas = bank.mean(f, Gaussian.GAS);
      double inert = bank.mean(f, Gaussian.AIR);
      double all = Math.max(gas + inert, 1e-9);
      double y = Math.max(0, inert / all);
      air += w * y;
      air2 += w * (y * y + bank.variance(f, Gaussian.AIR) / (all * all));
      rest +=
          w * slope * gas * Math.exp(bank.mean(f, Gaussian.RELATION) - bank.mean(f, Gaussian.FILL));
      double q = bank.mean(f, Gaussian.SOURCE);
      made += w * q;
      made2 += w * (q * q + bank.variance(f, Gaussian.SOURCE));
    }
    return new Summary(
        centre,
        half,
        rest,
        air,
        2 * Math.sqrt(Math.max(0, air2 - air * air)),
        transfers(bank),
        made,
        Math.sqrt(Math.max(0, made2 - made * made)));
  }

  private static double[] transfers(Bank bank) {
    double[] at = {0.025, 0.5, 0.975};
    double[] found = new double[3];
    double sum = 0;
    int next = 0;
    for (int f = 0; f < Grid.FILTERS && next < 3; f++) {
      sum += bank.weights[f];
      while (next < 3 && sum >= at[next] - 1e-12) {
        found[next++] = Grid.transferPerS(f);
      }
    }
    while (next < 3) {
      found[next++] = Grid.transferPerS(Grid.FILTERS - 1);
    }
    return found;
  }
}

package tunwarden.estimate.bank;

/** Reads the mixture of a bank. */
public final class Reader {
  private static final double LEAST_WEIGHT = 1e-4;
  private static final int BISECTIONS = 30;
  private static final double COVER = 0.955;
  private static final double EXPECTED_WEIGHT = 1e-3;
  private static final double COLD_S = 60;
  private static final double UNTOLD_TAIL = 0.006;
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
      double a = Math.max(0, quantile(w, mean, sd, n, UNTOLD_TAIL, low, high));
      double b = quantile(w, mean, sd, n, 1 - UNTOLD_TAIL, low, high);
      centre = 0.5 * (a + b);
      half = 0.5 * (b - a);
    } else {
      centre = Math.max(0, quantile(w, mean, sd, n, 0.5, low, high));
      half = halfWidth(w, mean, sd, n, cover(bank), centre, high - low);
    }
    return finish(bank, centre, half);
  }

  /** After pressure was held the prior weighs heavily, so its tails are not cut. */
  private static double cover(Bank bank) {
    return bank.modeWeight(Grid.CLOSED) > 0.5 ? 1 - 2 * UNTOLD_TAIL : COVER;
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
      double[] w, double[] mean, double[] sd, int n, double cover, double centre, double most) {
    double a = 0;
    double b = most;
    for (int i = 0; i < BISECTIONS; i++) {
      double c = 0.5 * (a + b);
      double inside = below(w, mean, sd, n, centre + c) - below(w, mean, sd, n, centre - c);
      if (inside < cover) {
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
    double slope = medium.solubility(s.kelvin(), s.paAbsolute());
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
      rest += w * slope * gas * Math.exp(bank.mean(f, Gaussian.RELATION));
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

  /** What the filters of weight expect of the next moments. */
  public Expectation expect(Bank bank) {
    Bank.Setting s = bank.setting;
    double solubility = medium.solubility(s.kelvin(), s.paAbsolute());
    double perPa = medium.headspace(s.kelvin(), s.paAbsolute(), s.fillKelvin());
    double level = 0;
    double low = 0;
    double high = 0;
    for (int f = 0; f < Grid.FILTERS; f++) {
      double w = bank.weights[f];
      double gas = bank.mean(f, Gaussian.GAS);
      boolean held = Grid.modeOf(f) == Grid.HELD;
      double heat = held ? 0 : bank.mean(f, Gaussian.HEAT);
      double rest = gas + bank.mean(f, Gaussian.AIR);
      level += w * (rest * (1 + heat) + bank.mean(f, Gaussian.BIAS));
      if (w < EXPECTED_WEIGHT || held) {
        continue;
      }
      double apart =
          bank.mean(f, Gaussian.LIQUID)
              - solubility * gas * Math.exp(bank.mean(f, Gaussian.RELATION));
      double k = perPa * Math.exp(bank.mean(f, Gaussian.FILL));
      double transfer = Grid.transferPerS(f) * Math.exp(bank.mean(f, Gaussian.PACE));
      double rate = transfer * apart / k - rest * heat / COLD_S;
      low = Math.min(low, rate);
      high = Math.max(high, rate);
    }
    return new Expectation(level, low, high);
  }

  /** CO2 in liquid and headspace together, kg per m3 of liquid, in the mean of the bank. */
  public double total(Bank bank) {
    Bank.Setting s = bank.setting;
    double perPa = medium.headspace(s.kelvin(), s.paAbsolute(), s.fillKelvin());
    double sum = 0;
    for (int f = 0; f < Grid.FILTERS; f++) {
      double k = perPa * Math.exp(bank.mean(f, Gaussian.FILL));
      sum += bank.weights[f] * (bank.mean(f, Gaussian.LIQUID) + k * bank.mean(f, Gaussian.GAS));
    }
    return sum;
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

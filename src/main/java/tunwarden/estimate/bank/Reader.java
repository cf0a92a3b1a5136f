package tunwarden.estimate.bank;

/** Reads the mixture of a bank. */
public final class Reader {
  private static final double LEAST_WEIGHT = 1e-4;
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
    Mixture liquid = new Mixture(Grid.FILTERS);
    for (int f = 0; f < Grid.FILTERS; f++) {
      if (bank.weights[f] > LEAST_WEIGHT) {
        double mean = bank.mean(f, Gaussian.LIQUID);
        double own = MODEL_SHARE * mean;
        liquid.add(bank.weights[f], mean, bank.variance(f, Gaussian.LIQUID) + own * own);
      }
    }
    double middle = Math.max(0, liquid.quantile(0.5));
    double held = bank.modeWeight(Grid.HELD);
    if (held <= 0.5) {
      return finish(bank, middle, liquid.halfWidth(middle, cover(bank)));
    }
    double low = Math.max(0, liquid.quantile(UNTOLD_TAIL));
    double high = liquid.quantile(1 - UNTOLD_TAIL);
    double untold = Math.min(1, (held - 0.5) / 0.45);
    double centre = middle + untold * (0.5 * (low + high) - middle);
    return finish(bank, centre, Math.max(high - centre, centre - low));
  }

  /** After pressure was held the prior weighs heavily, so its tails are not cut. */
  private static double cover(Bank bank) {
    return bank.modeWeight(Grid.CLOSED) > 0.5 ? 1 - 2 * UNTOLD_TAIL : COVER;
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

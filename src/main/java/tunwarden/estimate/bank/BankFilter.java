package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Gaussian.AIR;
import static tunwarden.estimate.bank.Gaussian.BIAS;
import static tunwarden.estimate.bank.Gaussian.FILL;
import static tunwarden.estimate.bank.Gaussian.GAS;
import static tunwarden.estimate.bank.Gaussian.HEAT;
import static tunwarden.estimate.bank.Gaussian.LIQUID;
import static tunwarden.estimate.bank.Gaussian.RELATION;
import static tunwarden.estimate.bank.Gaussian.SOURCE;

/** Moves a bank through time and lets it see readings. Holds no memory of its own. */
public final class BankFilter {
  private static final double MIX_EVERY_S = 60;
  private static final double HOUR_S = 3600;
  private static final double DAY_S = 86_400;
  private static final double FORGET_S = 30 * DAY_S;

  /** Slow change of a pinned level or of a nearly tight headspace: 3 mbar in an hour. */
  private static final double LEVEL_PA2_PER_S = 300.0 * 300 / HOUR_S;

  /** Weather and drift of the gauge: 4 mbar in a day. */
  private static final double BIAS_PA2_PER_S = 400.0 * 400 / DAY_S;

  private static final double RELATION_PER_K = 2e-6;
  private static final double LIQUID_SHARE = 0.002;
  private static final double SOURCE_SHARE = 0.3;
  private static final double SOURCE_LEAST = 0.05 * Prior.SOURCE_SD;
  private static final double COLD_MEMORY_S = 180;
  private static final double ADIABATIC_EXPONENT = 0.23;
  private static final double TAIL = 6;

  private final Medium medium;
  private final Prior prior;

  /** A filter for one vessel. */
  public BankFilter(Medium medium) {
    this.medium = medium;
    this.prior = new Prior(medium);
  }

  /** Starts from the first pair of readings. */
  public Bank begin(double kelvin, double paGauge) {
    double ambient = medium.vessel().site().ambientPaAbsolute();
    double total = Math.max(paGauge + ambient, 1000);
    double dry = Math.max(total - medium.vapourPa(kelvin), 500);
    Bank.Setting setting = new Bank.Setting(kelvin, total, kelvin, 0);
    Passage way = passage(setting, setting, 0);
    double[] filters = new double[Grid.FILTERS * Gaussian.STRIDE];
    Gaussian x = new Gaussian();
    for (int f = 0; f < Grid.FILTERS; f++) {
      prior.begin(x, f, way, dry, paGauge);
      x.store(filters, f * Gaussian.STRIDE);
    }
    return new Bank(filters, prior.weights(dry, paGauge), setting);
  }

  private Passage passage(Bank.Setting a, Bank.Setting b, double seconds) {
    double kelvin = 0.5 * (a.kelvin() + b.kelvin());
    double pa = 0.5 * (a.paAbsolute() + b.paAbsolute());
    return new Passage(
        seconds,
        medium.solubility(kelvin, pa),
        medium.headspace(a.kelvin(), a.paAbsolute(), a.fillKelvin()),
        medium.headspace(b.kelvin(), b.paAbsolute(), b.fillKelvin()),
        medium.co2Share());
  }

  /** Lets time pass up to a reading, which only sets the working point here. */
  public Bank move(Bank bank, Look look) {
    Bank.Setting before = bank.setting;
    double unmixed = before.unmixedS() + look.seconds();
    boolean mixes = unmixed >= MIX_EVERY_S;
    Bank.Setting after =
        new Bank.Setting(
            look.kelvin(), look.paAbsolute(), before.fillKelvin(), mixes ? 0 : unmixed);
    Passage way = passage(before, after, look.seconds());
    double[] filters = new double[bank.filters.length];
    double[] weights = bank.weights.clone();
    Gaussian x = new Gaussian();
    Motion motion = new Motion();
    double warmed = Math.abs(look.kelvin() - before.kelvin());
    for (int f = 0; f < Grid.FILTERS; f++) {
      x.load(bank.filters, f * Gaussian.STRIDE);
      if (Grid.modeOf(f) == Grid.HELD || look.flowing()) {
        motion.held(x, Grid.transferPerS(f), way);
      } else {
        motion.sealed(x, Grid.transferPerS(f), way);
      }
      disturb(x, f, way, warmed);
      if (look.flowing()) {
        flow(x, motion, way, look);
      }
      x.store(filters, f * Gaussian.STRIDE);
    }
    if (mixes) {
      new Mixer().mix(filters, weights, prior.transitions(unmixed));
      forget(weights, unmixed);
    }
    return new Bank(filters, weights, after);
  }

  /** Noise that stands for everything the model leaves out. */
  private static void disturb(Gaussian x, int filter, Passage way, double warmed) {
    double dt = way.seconds();
    double perPa = way.after() * Math.exp(x.mean[FILL]);
    x.addVariance(GAS, perPa * perPa * LEVEL_PA2_PER_S * dt);
    x.addVariance(BIAS, BIAS_PA2_PER_S * dt);
    x.addVariance(RELATION, RELATION_PER_K * warmed);
    double liquid = LIQUID_SHARE * x.mean[LIQUID];
    x.addVariance(LIQUID, liquid * liquid * dt / DAY_S);
    Motion.soothe(x, dt, COLD_MEMORY_S);
    if (Grid.modeOf(filter) != Grid.STILL) {
      double step = SOURCE_SHARE * Math.max(Math.abs(x.mean[SOURCE]), SOURCE_LEAST);
      x.addVariance(SOURCE, 2 * step * step * dt / DAY_S);
    }
  }

  /** Gas passes a valve: whatever the reading says, every species changes in proportion. */
  private void flow(Gaussian x, Motion motion, Passage way, Look look) {
    double dry = look.paAbsolute() - medium.vapourPa(look.kelvin()) - x.mean[BIAS];
    double own = (x.mean[GAS] + x.mean[AIR]) * Math.exp(-x.mean[FILL]) / way.after();
    double ratio = Math.max(0.02, Math.min(50, dry / own));
    motion.stretch(x, ratio, way.supplyShare());
    double doubt = 0.03 * (dry - own) * way.after();
    x.addVariance(GAS, doubt * doubt);
    double heat = ADIABATIC_EXPONENT * Math.log(ratio);
    x.mean[HEAT] += 0.4 * heat;
    x.addVariance(HEAT, 0.16 * heat * heat);
  }

  private void forget(double[] weights, double seconds) {
    double share = Math.min(0.5, seconds / FORGET_S) / Grid.FILTERS;
    for (int f = 0; f < weights.length; f++) {
      weights[f] += share * 0.1;
    }
    Bank.normalized(weights);
  }

  /** Weighs and corrects every filter by a pressure. */
  public Bank see(Bank bank, Look look) {
    double[] filters = bank.filters.clone();
    double[] evidence = new double[Grid.FILTERS];
    Gaussian x = new Gaussian();
    double[] row = new double[Gaussian.STATES];
    double perPa = medium.headspace(look.kelvin(), look.paAbsolute(), bank.setting.fillKelvin());
    double dry = look.paAbsolute() - medium.vapourPa(look.kelvin());
    for (int f = 0; f < Grid.FILTERS; f++) {
      x.load(filters, f * Gaussian.STRIDE);
      double predicted = predict(x, f, perPa, row);
      double total = x.varianceOf(row) + look.variance();
      double miss = dry - predicted;
      evidence[f] = logLikelihood(miss, total);
      x.condition(row, miss, total * Math.max(1, miss * miss / (total * 25)));
      x.store(filters, f * Gaussian.STRIDE);
    }
    double[] weights = look.flowing() ? bank.weights : reweigh(bank.weights, evidence);
    return new Bank(filters, weights, bank.setting);
  }

  /** Dry absolute pressure a filter expects, and its slopes. */
  private static double predict(Gaussian x, int filter, double perPa, double[] row) {
    boolean held = Grid.modeOf(filter) == Grid.HELD;
    double heat = held ? 1 : 1 + x.mean[HEAT];
    double per = Math.exp(-x.mean[FILL]) / perPa;
    double cold = (x.mean[GAS] + x.mean[AIR]) * per;
    row[GAS] = per * heat;
    row[AIR] = per * heat;
    row[FILL] = -cold * heat;
    row[HEAT] = held ? 0 : cold;
    row[BIAS] = 1;
    row[RELATION] = 0;
    return cold * heat + x.mean[BIAS];
  }

  /** Student's t with a few degrees of freedom: one odd reading is no proof. */
  private static double logLikelihood(double miss, double total) {
    return -0.5 * Math.log(total) - 0.5 * (TAIL + 1) * Math.log(1 + miss * miss / (total * TAIL));
  }

  private static double[] reweigh(double[] weights, double[] evidence) {
    double best = Double.NEGATIVE_INFINITY;
    for (int f = 0; f < evidence.length; f++) {
      if (weights[f] > 1e-9) {
        best = Math.max(best, evidence[f]);
      }
    }
    double[] next = new double[weights.length];
    for (int f = 0; f < next.length; f++) {
      next[f] = Math.max(weights[f] * Math.exp(Math.min(evidence[f] - best, 5)), 1e-30);
    }
    return Bank.normalized(next);
  }

  /** A laboratory value of the dissolved gas, kg/m3, with its standard uncertainty. */
  public Bank tell(Bank bank, double dissolved, double standardU) {
    double[] filters = bank.filters.clone();
    double[] evidence = new double[Grid.FILTERS];
    Gaussian x = new Gaussian();
    double[] row = new double[Gaussian.STATES];
    row[LIQUID] = 1;
    for (int f = 0; f < Grid.FILTERS; f++) {
      x.load(filters, f * Gaussian.STRIDE);
      double total = x.variance(LIQUID) + standardU * standardU;
      double miss = dissolved - x.mean[LIQUID];
      evidence[f] = logLikelihood(miss, total);
      x.condition(row, miss, total);
      x.store(filters, f * Gaussian.STRIDE);
    }
    return new Bank(filters, reweigh(bank.weights, evidence), bank.setting);
  }

  /** Somebody has worked a valve: how the headspace is connected is open again. */
  public Bank valveWorked(Bank bank) {
    double[] filters = bank.filters.clone();
    double[] weights = bank.weights.clone();
    new Mixer().mix(filters, weights, prior.afterValve());
    return new Bank(filters, weights, bank.setting);
  }
}

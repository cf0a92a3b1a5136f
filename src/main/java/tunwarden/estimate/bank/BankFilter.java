package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Gaussian.AIR;
import static tunwarden.estimate.bank.Gaussian.BIAS;
import static tunwarden.estimate.bank.Gaussian.GAS;
import static tunwarden.estimate.bank.Gaussian.HEAT;
import static tunwarden.estimate.bank.Gaussian.LIQUID;
import static tunwarden.estimate.bank.Gaussian.PACE;
import static tunwarden.estimate.bank.Gaussian.SOURCE;

/** Moves a bank through time and lets it see readings. Holds no memory of its own. */
public final class BankFilter {
  private static final double MIX_EVERY_S = 60;

  /** Share of the evidence that counts while gas re-warms: its pace is the same at every lift. */
  private static final double RECOVERING_TRUST = 0.2;

  private static final double DRIFT_MEMORY_S = 1200;
  private static final double NOT_SEEN = -1e300;
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
    Bank.Setting setting = new Bank.Setting(kelvin, total, kelvin, 0, 0);
    Passage way = passage(setting, setting, 0);
    double[] filters = new double[Grid.FILTERS * Gaussian.STRIDE];
    Gaussian x = new Gaussian();
    for (int f = 0; f < Grid.FILTERS; f++) {
      prior.begin(x, f, way, dry, paGauge);
      x.store(filters, f * Gaussian.STRIDE);
    }
    return new Bank(filters, prior.weights(dry, paGauge), setting);
  }

  Passage passage(Bank.Setting a, Bank.Setting b, double seconds) {
    double kelvin = 0.5 * (a.kelvin() + b.kelvin());
    double pa = 0.5 * (a.paAbsolute() + b.paAbsolute());
    return new Passage(
        seconds,
        medium.solubility(kelvin, pa),
        medium.headspace(a.kelvin(), a.paAbsolute(), a.fillKelvin()),
        medium.headspace(b.kelvin(), b.paAbsolute(), b.fillKelvin()),
        medium.co2Share());
  }

  private double solubility(Bank.Setting setting) {
    return medium.solubility(setting.kelvin(), setting.paAbsolute());
  }

  /** Lets time pass up to a reading, and weighs and corrects every filter by it. */
  public Bank step(Bank bank, Look look) {
    Bank.Setting before = bank.setting;
    double unmixed = before.unmixedS() + look.seconds();
    boolean mixes = unmixed >= MIX_EVERY_S;
    double[] filters = bank.filters.clone();
    double[] weights = bank.weights.clone();
    boolean shaken = mixes && bank.hasLostTrack();
    if (mixes) {
      Mixer mixer = new Mixer(solubility(before));
      mixer.mix(
          filters,
          weights,
          shaken ? prior.whenNothingFits() : prior.transitions(unmixed),
          shaken ? Mixer.anew(behindPa(bank, look)) : Mixer.GENTLY);
      mixer.mixPaces(filters, weights, unmixed);
    }
    Bank.Setting after =
        new Bank.Setting(
            look.kelvin(), look.paAbsolute(), before.fillKelvin(), mixes ? 0 : unmixed, 0);
    Passage way = passage(before, after, look.seconds());
    double[] evidence = new double[Grid.FILTERS];
    Worker worker = new Worker(way, look);
    for (int f = 0; f < Grid.FILTERS; f++) {
      evidence[f] = weights[f] > Mixer.ASLEEP ? worker.work(filters, weights[f], f) : NOT_SEEN;
    }
    double[] next =
        look.flowing()
            ? weights
            : reweigh(weights, evidence, look.recovering() ? RECOVERING_TRUST : 1);
    double drift = shaken || look.flowing() ? 0 : drift(before.drift(), worker.surprise, look);
    return new Bank(filters, next, after.withDrift(drift));
  }

  /** How far the bank's own level lies behind a reading, Pa. */
  private double behindPa(Bank bank, Look look) {
    double level = new Reader(medium).expect(bank).paDry();
    return look.paAbsolute() - medium.vapourPa(look.kelvin()) - level;
  }

  /**
   * Running sum of the standardized surprise of the whole bank, scaled to unit variance: far from
   * zero when the readings leave every filter on the same side.
   */
  private static double drift(double before, double surprise, Look look) {
    double fresh = 1 - Math.exp(-look.seconds() / DRIFT_MEMORY_S);
    return (1 - fresh) * before + Math.sqrt(fresh * (2 - fresh)) * surprise;
  }

  /** The working space of one step. */
  private final class Worker {
    private final Gaussian x = new Gaussian();
    private final Motion motion = new Motion();
    private final double[] row = new double[Gaussian.STATES];
    private final Passage way;
    private final Look look;
    private final double dry;
    private double surprise;

    Worker(Passage way, Look look) {
      this.way = way;
      this.look = look;
      this.dry = look.paAbsolute() - medium.vapourPa(look.kelvin());
    }

    private Gaussian.Considered considered() {
      return look.recovering() ? Gaussian.Considered.AND_PACE : Gaussian.Considered.CONSTANTS;
    }

    /** Moves, disturbs and corrects one filter; its log-likelihood comes back. */
    double work(double[] filters, double weight, int f) {
      x.load(filters, f * Gaussian.STRIDE);
      int mode = Grid.modeOf(f);
      if (mode == Grid.HELD || look.flowing()) {
        motion.held(x, Grid.transferPerS(f), way);
      } else {
        motion.sealed(x, Grid.transferPerS(f), way);
      }
      Disturbance.add(x, mode, way, look.swingK());
      if (look.flowing()) {
        flow(x, way, look);
      }
      double miss = dry - predict(x, mode, row);
      double total = x.varianceOf(row) + look.variance();
      surprise += weight * Math.max(-4, Math.min(4, miss / Math.sqrt(total)));
      x.condition(miss, total * Math.max(1, miss * miss / (total * 25)), considered());
      bound(x, f);
      x.store(filters, f * Gaussian.STRIDE);
      return logLikelihood(miss, total);
    }
  }

  /** Gas passes a valve: whatever the reading says, every species changes in proportion. */
  private void flow(Gaussian x, Passage way, Look look) {
    double dry = look.paAbsolute() - medium.vapourPa(look.kelvin()) - x.mean[BIAS];
    double own = x.mean[GAS] + x.mean[AIR];
    double ratio = Math.max(0.02, Math.min(50, dry / own));
    if (ratio <= 1) {
      Motion.scale(x, ratio);
    } else {
      Motion.charge(x, dry - own, way.supplyShare());
    }
    double doubt = 0.03 * (dry - own);
    x.addVariance(GAS, doubt * doubt);
    double heat = ADIABATIC_EXPONENT * Math.log(ratio);
    x.mean[HEAT] += 0.4 * heat;
    x.addVariance(HEAT, 0.16 * heat * heat);
  }

  /** Keeps a filter in its class of transfer and out of the impossible. */
  private static void bound(Gaussian x, int filter) {
    int mode = Grid.modeOf(filter);
    if (mode == Grid.MAKING) {
      x.mean[SOURCE] = Math.max(x.mean[SOURCE], 0);
    } else if (mode == Grid.LEAKING) {
      x.mean[SOURCE] = Math.min(x.mean[SOURCE], 0);
    }
    if (mode == Grid.HELD) {
      double most = Prior.MOST_SURPLUS * x.mean[LIQUID] * Grid.transferPerS(filter);
      x.limit(SOURCE, most);
    }
    double reach = 1.5;
    x.mean[PACE] = Math.max(-reach, Math.min(reach, x.mean[PACE]));
    x.mean[LIQUID] = Math.max(x.mean[LIQUID], 0);
    x.mean[GAS] = Math.max(x.mean[GAS], 1);
  }

  /** Dry absolute pressure a filter expects, and its slopes. */
  static double predict(Gaussian x, int mode, double[] row) {
    double heat = mode == Grid.HELD ? 0 : x.mean[HEAT];
    double rest = x.mean[GAS] + x.mean[AIR];
    row[GAS] = 1 + heat;
    row[AIR] = 1 + heat;
    row[HEAT] = mode == Grid.HELD ? 0 : rest;
    row[BIAS] = 1;
    return rest * (1 + heat) + x.mean[BIAS];
  }

  /** Student's t with a few degrees of freedom: one odd reading is no proof. */
  private static double logLikelihood(double miss, double total) {
    return -0.5 * Math.log(total) - 0.5 * (TAIL + 1) * Math.log(1 + miss * miss / (total * TAIL));
  }

  private static double[] reweigh(double[] weights, double[] evidence, double trust) {
    double best = Double.NEGATIVE_INFINITY;
    for (int f = 0; f < evidence.length; f++) {
      if (weights[f] > 1e-9) {
        best = Math.max(best, evidence[f]);
      }
    }
    double[] next = new double[weights.length];
    for (int f = 0; f < next.length; f++) {
      next[f] = Math.max(weights[f] * Math.exp(trust * Math.min(evidence[f] - best, 5)), 1e-30);
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
      double total = x.varianceOf(row) + standardU * standardU;
      double miss = dissolved - x.mean[LIQUID];
      evidence[f] = logLikelihood(miss, total);
      x.condition(miss, total, Gaussian.Considered.NOTHING);
      x.store(filters, f * Gaussian.STRIDE);
    }
    return new Bank(filters, reweigh(bank.weights, evidence, 1), bank.setting);
  }

  /** Somebody has worked a valve: how the headspace is connected is open again. */
  public Bank valveWorked(Bank bank) {
    double[] filters = bank.filters.clone();
    double[] weights = bank.weights.clone();
    new Mixer(solubility(bank.setting)).mix(filters, weights, prior.afterValve(), Mixer.anew(0));
    return new Bank(filters, weights, bank.setting);
  }
}

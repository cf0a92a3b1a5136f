package tunwarden.rehearse;

import java.util.Random;

/**
 * An instrument with a constant error, noise and a display step. {@link Random} is used for its
 * published algorithm: the same seed gives the same log everywhere.
 */
final class SimulatedSensor {
  private final Random random;
  private final double bias;
  private final double noise;
  private final double step;
  private double frozen = Double.NaN;
  private double last;

  /** All in the unit of the value; {@code step} is what the last digit is worth. */
  SimulatedSensor(Random random, double bias, double noise, double step) {
    this.random = random;
    this.bias = bias;
    this.noise = noise;
    this.step = step;
  }

  /** What it shows of a true value. */
  double show(double truth) {
    double shown = truth + bias + noise * random.nextGaussian();
    last = Double.isNaN(frozen) ? Math.rint(shown / step) * step : frozen;
    return last;
  }

  /** Stops following from now on. */
  void freeze() {
    frozen = last;
  }
}

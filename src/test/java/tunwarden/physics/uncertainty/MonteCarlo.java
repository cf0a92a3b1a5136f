package tunwarden.physics.uncertainty;

import java.util.Arrays;
import java.util.Random;
import java.util.function.ToDoubleFunction;

/**
 * Propagation of distributions, JCGM 101:2008, with normal inputs; the check on the first order.
 */
public final class MonteCarlo {
  private final double[] sorted;

  /** Draws normal inputs and keeps the outputs in order. */
  public MonteCarlo(
      double[] value, double[] standard, int trials, ToDoubleFunction<double[]> model) {
    Random random = new Random(20260301);
    sorted = new double[trials];
    double[] x = new double[value.length];
    for (int n = 0; n < trials; n++) {
      for (int i = 0; i < x.length; i++) {
        x[i] = value[i] + standard[i] * random.nextGaussian();
      }
      sorted[n] = model.applyAsDouble(x);
    }
    Arrays.sort(sorted);
  }

  /** Half the width of the interval that leaves 2.5 % on either side. */
  public double u95() {
    int tail = Math.round(0.025f * sorted.length);
    return (sorted[sorted.length - 1 - tail] - sorted[tail]) / 2;
  }
}

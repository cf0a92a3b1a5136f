package tunwarden.physics.uncertainty;

import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * First-order propagation of uncertainty through any function, JCGM 100:2008 (GUM), correlated
 * inputs and several outputs allowed. Sensitivities are taken numerically over one standard
 * uncertainty to either side (5.1.3, note 2), so a mildly bent function is met over the width that
 * matters.
 */
public final class LinearPropagation {
  /** Coverage factor of a 95 % interval of a normal distribution, JCGM 100 table G.1. */
  public static final double COVERAGE_95 = 1.96;

  private final double[] value;
  private final double[] standard;
  private final double[][] correlation;

  private LinearPropagation(double[] value, double[] standard, double[][] correlation) {
    this.value = value;
    this.standard = standard;
    this.correlation = correlation;
  }

  /**
   * Independent inputs.
   *
   * @param value best estimates
   * @param standard standard uncertainties, none negative
   */
  public static LinearPropagation independent(double[] value, double[] standard) {
    double[][] unit = new double[value.length][value.length];
    for (int i = 0; i < value.length; i++) {
      unit[i][i] = 1;
    }
    return correlated(value, standard, unit);
  }

  /** Inputs with a correlation matrix. */
  public static LinearPropagation correlated(
      double[] value, double[] standard, double[][] correlation) {
    if (value.length != standard.length || value.length != correlation.length) {
      throw new IllegalArgumentException("values, uncertainties and correlations differ in number");
    }
    return new LinearPropagation(value.clone(), standard.clone(), correlation);
  }

  /** Carries the inputs through the functions. */
  public Propagated through(List<ToDoubleFunction<double[]>> functions) {
    int outputs = functions.size();
    double[] out = new double[outputs];
    double[][] share = new double[outputs][];
    for (int k = 0; k < outputs; k++) {
      out[k] = functions.get(k).applyAsDouble(value.clone());
      share[k] = shares(functions.get(k));
    }
    double[][] covariance = new double[outputs][outputs];
    for (int k = 0; k < outputs; k++) {
      for (int l = 0; l < outputs; l++) {
        covariance[k][l] = covariance(share[k], share[l]);
      }
    }
    return new Propagated(out, covariance);
  }

  /** Carries the inputs through one function. */
  public Propagated through(ToDoubleFunction<double[]> function) {
    return through(List.of(function));
  }

  /** Sensitivity times standard uncertainty of every input, JCGM 100 Eq. 11b. */
  private double[] shares(ToDoubleFunction<double[]> function) {
    double[] share = new double[value.length];
    for (int i = 0; i < value.length; i++) {
      if (standard[i] > 0) {
        double[] moved = value.clone();
        moved[i] = value[i] + standard[i];
        double above = function.applyAsDouble(moved);
        moved[i] = value[i] - standard[i];
        share[i] = (above - function.applyAsDouble(moved)) / 2;
      }
    }
    return share;
  }

  private double covariance(double[] one, double[] other) {
    double sum = 0;
    for (int i = 0; i < value.length; i++) {
      for (int j = 0; j < value.length; j++) {
        sum += one[i] * other[j] * correlation[i][j]; // Eq. 16; H.9 between outputs
      }
    }
    return sum;
  }
}

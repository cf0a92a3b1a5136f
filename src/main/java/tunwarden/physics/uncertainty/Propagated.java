package tunwarden.physics.uncertainty;

/** Results of a propagation: values, standard uncertainties, and correlations. */
public final class Propagated {
  private final double[] value;
  private final double[][] covariance;

  Propagated(double[] value, double[][] covariance) {
    this.value = value;
    this.covariance = covariance;
  }

  /** The first result. */
  public double value() {
    return value(0);
  }

  /** Result number {@code k}. */
  public double value(int k) {
    return value[k];
  }

  /** Combined standard uncertainty of the first result. */
  public double standard() {
    return standard(0);
  }

  /** Combined standard uncertainty of result number {@code k}. */
  public double standard(int k) {
    return Math.sqrt(covariance[k][k]);
  }

  /** Expanded uncertainty of the first result, 95 %. */
  public double u95() {
    return LinearPropagation.COVERAGE_95 * standard();
  }

  /** Correlation coefficient between two results. */
  public double correlation(int k, int l) {
    return covariance[k][l] / (standard(k) * standard(l));
  }
}

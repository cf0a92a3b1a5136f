package tunwarden.estimate.bank;

import java.nio.ByteBuffer;

/**
 * The bank at one time: the filters, packed, and their weights. Immutable by agreement: nobody
 * writes to the arrays after construction.
 */
public final class Bank {
  private static final double DRIFT_LIMIT = 3.5;

  final double[] filters;
  final double[] weights;
  final Setting setting;

  /**
   * Circumstances the filters refer to.
   *
   * @param kelvin liquid temperature
   * @param paAbsolute total pressure, for the slopes of gas and solubility
   * @param fillKelvin temperature at which the fill was stated
   * @param unmixedS time since the modes last exchanged weight, s
   * @param drift running surprise of the whole bank, in standard deviations
   */
  public record Setting(
      double kelvin, double paAbsolute, double fillKelvin, double unmixedS, double drift) {
    Setting withDrift(double other) {
      return new Setting(kelvin, paAbsolute, fillKelvin, unmixedS, other);
    }
  }

  Bank(double[] filters, double[] weights, Setting setting) {
    this.filters = filters;
    this.weights = weights;
    this.setting = setting;
  }

  /** Bytes that {@link #write} takes. */
  public static int bytes() {
    return 8 * (Grid.FILTERS * (Gaussian.STRIDE + 1) + 5);
  }

  /** Writes every digit. */
  public void write(ByteBuffer to) {
    for (double value : filters) {
      to.putDouble(value);
    }
    for (double value : weights) {
      to.putDouble(value);
    }
    to.putDouble(setting.kelvin()).putDouble(setting.paAbsolute());
    to.putDouble(setting.fillKelvin()).putDouble(setting.unmixedS()).putDouble(setting.drift());
  }

  /** Reads what {@link #write} wrote. */
  public static Bank read(ByteBuffer from) {
    double[] filters = new double[Grid.FILTERS * Gaussian.STRIDE];
    double[] weights = new double[Grid.FILTERS];
    for (int i = 0; i < filters.length; i++) {
      filters[i] = from.getDouble();
    }
    for (int i = 0; i < weights.length; i++) {
      weights[i] = from.getDouble();
    }
    Setting setting =
        new Setting(
            from.getDouble(),
            from.getDouble(),
            from.getDouble(),
            from.getDouble(),
            from.getDouble());
    return new Bank(filters, weights, setting);
  }

  public Setting setting() {
    return setting;
  }

  /** Whether the readings have left every filter on the same side, so that it starts afresh. */
  public boolean hasLostTrack() {
    return Math.abs(setting.drift()) > DRIFT_LIMIT;
  }

  double mean(int filter, int state) {
    return filters[filter * Gaussian.STRIDE + state];
  }

  double variance(int filter, int state) {
    int packed = Gaussian.STATES + state * (state + 3) / 2;
    return filters[filter * Gaussian.STRIDE + packed];
  }

  /** Total weight of one way of connection, 0..1. */
  public double modeWeight(int mode) {
    double sum = 0;
    for (int f = mode; f < Grid.FILTERS; f += Grid.MODES) {
      sum += weights[f];
    }
    return sum;
  }

  static double[] normalized(double[] weights) {
    double sum = 0;
    for (double weight : weights) {
      sum += weight;
    }
    for (int i = 0; i < weights.length; i++) {
      weights[i] /= sum;
    }
    return weights;
  }
}

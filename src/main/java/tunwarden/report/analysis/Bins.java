package tunwarden.report.analysis;

import java.util.Arrays;

/**
 * The whole log in at most {@link #MOST} equal stretches of time, whatever its length: the extremes
 * and means that plots and the backward pass need. When it grows too long, neighbours are merged.
 */
public final class Bins {
  /** Most stretches kept. */
  public static final int MOST = 2048;

  private static final int SUMS = 7;
  private static final int PRESSURE = 0;
  private static final int TEMPERATURE = 1;
  private static final int DISSOLVED = 2;
  private static final int U95 = 3;
  private static final int EQUILIBRIUM = 4;
  private static final int MADE = 5;
  private static final int SEALED = 6;

  private final double[][] sum = new double[SUMS][MOST];
  private final int[][] count = new int[SUMS][MOST];
  private final double[] low = new double[MOST];
  private final double[] high = new double[MOST];
  private final long originMs;
  private long widthMs = 1000;
  private int used;

  /** Starts at the first row's time, milliseconds since 1970. */
  public Bins(long originMs) {
    this.originMs = originMs;
    Arrays.fill(low, Double.POSITIVE_INFINITY);
    Arrays.fill(high, Double.NEGATIVE_INFINITY);
  }

  /**
   * Takes in a row.
   *
   * @param madeKgPerM3PerS rate of gas being made, 0 where unknown
   * @param sealed whether the headspace is believed shut
   */
  void add(ReportRow row, double madeKgPerM3PerS, boolean sealed) {
    long offset = row.time().toEpochMilli() - originMs;
    if (offset < 0) {
      return;
    }
    while (offset / widthMs >= MOST) {
      merge();
    }
    int bin = (int) (offset / widthMs);
    used = Math.max(used, bin + 1);
    if (!Double.isNaN(row.paGauge())) {
      low[bin] = Math.min(low[bin], row.paGauge());
      high[bin] = Math.max(high[bin], row.paGauge());
    }
    put(PRESSURE, bin, row.paGauge());
    put(TEMPERATURE, bin, row.temperatureK());
    put(DISSOLVED, bin, row.dissolvedKgPerM3());
    put(U95, bin, row.u95KgPerM3());
    put(EQUILIBRIUM, bin, row.equilibriumKgPerM3());
    put(MADE, bin, madeKgPerM3PerS);
    put(SEALED, bin, sealed ? 1 : 0);
  }

  private void put(int what, int bin, double value) {
    if (!Double.isNaN(value)) {
      sum[what][bin] += value;
      count[what][bin]++;
    }
  }

  private void merge() {
    for (int bin = 0; bin < MOST; bin++) {
      int from = 2 * bin;
      boolean inside = from < MOST;
      low[bin] = inside ? Math.min(low[from], low[from + 1]) : Double.POSITIVE_INFINITY;
      high[bin] = inside ? Math.max(high[from], high[from + 1]) : Double.NEGATIVE_INFINITY;
      for (int what = 0; what < SUMS; what++) {
        sum[what][bin] = inside ? sum[what][from] + sum[what][from + 1] : 0;
        count[what][bin] = inside ? count[what][from] + count[what][from + 1] : 0;
      }
    }
    widthMs *= 2;
    used = (used + 1) / 2;
  }

  /** Number of stretches. */
  public int size() {
    return used;
  }

  /** Middle of a stretch, milliseconds since 1970. */
  public long middleMs(int bin) {
    return originMs + bin * widthMs + widthMs / 2;
  }

  /** Width of each stretch, ms. */
  public long widthMs() {
    return widthMs;
  }

  /** Least pressure, Pa gauge; infinite where nothing was read. */
  public double lowPa(int bin) {
    return low[bin];
  }

  /** Greatest pressure, Pa gauge; minus infinity where nothing was read. */
  public double highPa(int bin) {
    return high[bin];
  }

  /** Mean pressure, Pa gauge, or NaN. */
  public double pressurePa(int bin) {
    return mean(PRESSURE, bin);
  }

  /** Mean temperature, K, or NaN. */
  public double temperatureK(int bin) {
    return mean(TEMPERATURE, bin);
  }

  /** Mean dissolved CO2, kg/m³, or NaN. */
  public double dissolved(int bin) {
    return mean(DISSOLVED, bin);
  }

  /** Mean half-width, kg/m³, or NaN. */
  public double u95(int bin) {
    return mean(U95, bin);
  }

  /** Mean content at rest, kg/m³, or NaN. */
  public double equilibrium(int bin) {
    return mean(EQUILIBRIUM, bin);
  }

  /** Mean rate of gas being made, kg/m³/s; 0 where unknown. */
  public double made(int bin) {
    return count[MADE][bin] == 0 ? 0 : mean(MADE, bin);
  }

  /** Whether the headspace was believed shut all the time. */
  public boolean isSealed(int bin) {
    return mean(SEALED, bin) == 1;
  }

  /** Number of pressures read. */
  public int rows(int bin) {
    return count[PRESSURE][bin];
  }

  private double mean(int what, int bin) {
    return count[what][bin] == 0 ? Double.NaN : sum[what][bin] / count[what][bin];
  }
}

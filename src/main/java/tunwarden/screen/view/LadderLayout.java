package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tunwarden.assess.Rung;

/**
 * Where the rungs of a ladder stand on a scale of so many rows. The scale itself is true; a label
 * that would fall on another is moved as little as possible, never past its neighbour.
 *
 * @param rungs those shown, highest first
 * @param labelRow row of each rung's label
 * @param topPa pressure at the upper edge, Pa gauge
 * @param bottomPa pressure at the lower edge, Pa gauge
 * @param rows height of the scale
 */
record LadderLayout(List<Rung> rungs, int[] labelRow, double topPa, double bottomPa, int rows) {
  private static final double PAD_SHARE = 0.03;
  private static final double LEAST_SPAN_PA = 10_000;

  /** Lays out what fits, leaving out the least important where there are more rungs than rows. */
  static LadderLayout of(List<Rung> all, int rows) {
    List<Rung> finite =
        all.stream().filter(rung -> Double.isFinite(rung.paGauge())).limit(1000).toList();
    List<Rung> kept = mostImportant(finite, rows);
    double high = finite.stream().mapToDouble(Rung::paGauge).max().orElse(LEAST_SPAN_PA);
    double low = finite.stream().mapToDouble(Rung::paGauge).min().orElse(0);
    double span = Math.max(LEAST_SPAN_PA, high - low);
    double top = high + PAD_SHARE * span;
    double bottom = Math.min(low, high - span) - PAD_SHARE * span;
    double[] wanted = new double[kept.size()];
    for (int i = 0; i < wanted.length; i++) {
      wanted[i] = Math.floor((top - kept.get(i).paGauge()) / (top - bottom) * rows);
    }
    return new LadderLayout(kept, spread(wanted, rows), top, bottom, rows);
  }

  private static List<Rung> mostImportant(List<Rung> all, int rows) {
    List<Rung> kept = new ArrayList<>(all);
    kept.sort(Comparator.comparingInt(rung -> unimportance(rung.kind())));
    List<Rung> fitting = new ArrayList<>(kept.subList(0, Math.min(rows, kept.size())));
    fitting.sort(Comparator.comparingDouble(Rung::paGauge).reversed());
    return fitting;
  }

  private static int unimportance(Rung.Kind kind) {
    return switch (kind) {
      case NOW -> 0;
      case RELIEF_SET -> 1;
      case EARLIEST_LIFT -> 2;
      case VESSEL_LIMIT -> 3;
      case FORECAST -> 4;
      case ATMOSPHERE -> 5;
      case VACUUM_LIMIT -> 6;
      case OPERATING_CEILING -> 7;
      case ACCUMULATION -> 8;
      case RESEAT -> 9;
    };
  }

  /**
   * Distinct rows in the same order, as near as can be in the least-squares sense: isotonic
   * regression of the wanted row minus the index, by pooling adjacent violators.
   */
  static int[] spread(double[] wanted, int rows) {
    int n = wanted.length;
    double[] mean = new double[n];
    int[] count = new int[n];
    int pools = 0;
    for (int i = 0; i < n; i++) {
      mean[pools] = wanted[i] - i;
      count[pools++] = 1;
      while (pools > 1 && mean[pools - 2] > mean[pools - 1]) {
        int both = count[pools - 2] + count[pools - 1];
        double sum = mean[pools - 2] * count[pools - 2] + mean[pools - 1] * count[pools - 1];
        mean[pools - 2] = sum / both;
        count[--pools - 1] = both;
      }
    }
    int[] row = new int[n];
    int i = 0;
    for (int pool = 0; pool < pools; pool++) {
      int start = (int) Math.max(0, Math.min(rows - n, Math.floor(mean[pool] + 0.5)));
      for (int k = 0; k < count[pool]; k++, i++) {
        row[i] = start + i;
      }
    }
    return row;
  }

  /** Position on the scale in rows from the top edge; not rounded. */
  double position(double paGauge) {
    return (topPa - paGauge) / (topPa - bottomPa) * rows;
  }

  /** The true row of a pressure. */
  int trueRow(double paGauge) {
    return (int) Math.max(0, Math.min(rows - 1, Math.floor(position(paGauge))));
  }
}

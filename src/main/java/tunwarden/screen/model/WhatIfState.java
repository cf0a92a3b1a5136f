package tunwarden.screen.model;

/**
 * The table of what may happen to the vessel, on the vessel page in place of the chart.
 *
 * @param open whether it is shown
 * @param chosen number of the row told of in full, from 0
 */
public record WhatIfState(boolean open, int chosen) {
  /** The chart is shown. */
  public static final WhatIfState SHUT = new WhatIfState(false, 0);

  WhatIfState toggled() {
    return new WhatIfState(!open, chosen);
  }

  /** The row so many further on, of so many; the ends meet. */
  WhatIfState moved(int by, int rows) {
    return new WhatIfState(open, rows == 0 ? 0 : Math.floorMod(within(rows) + by, rows));
  }

  /** The chosen row where there are only so many. */
  public int within(int rows) {
    return Math.max(0, Math.min(chosen, rows - 1));
  }
}

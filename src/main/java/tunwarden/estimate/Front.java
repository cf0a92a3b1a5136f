package tunwarden.estimate;

/**
 * What is remembered between readings on the fast side of the bank: the block being averaged, the
 * reading that surprised, the flow that goes on. Times are seconds since the epoch; pressures Pa
 * gauge; immutable.
 *
 * @param bankS when the bank was last moved
 * @param sumPa sum of the readings since
 * @param count how many
 * @param last newest reading that was believed
 * @param doubt a reading that nothing led to expect, waiting for the next to confirm it; null for
 *     none
 * @param flow the flow that goes on; null for none
 * @param intervalS usual time between readings
 * @param flowS when gas was last seen passing a valve; negative infinity for never
 */
record Front(
    double bankS,
    double sumPa,
    int count,
    Point last,
    Point doubt,
    Flow flow,
    double intervalS,
    double flowS) {

  /** A reading. */
  record Point(double atS, double paGauge) {}

  /**
   * Gas passing a valve.
   *
   * @param begin last reading before it
   * @param first first reading that showed it
   * @param moving newest reading that still showed it
   * @param quiet readings in a row that show no flow any more
   */
  record Flow(Point begin, Point first, Point moving, int quiet) {
    Flow moves(Point to) {
      return new Flow(begin, first, to, 0);
    }

    Flow rests() {
      return new Flow(begin, first, moving, quiet + 1);
    }
  }

  static Front start(Point first) {
    return new Front(first.atS(), 0, 0, first, null, null, 10, Double.NEGATIVE_INFINITY);
  }

  /** Adds a believed reading to the block. */
  Front with(Point point) {
    double gap = point.atS() - last.atS();
    double usual = intervalS + 0.1 * (Math.min(gap, 600) - intervalS);
    return new Front(
        bankS, sumPa + point.paGauge(), count + 1, point, null, flow, Math.max(usual, 0.5), flowS);
  }

  Front emptied(double atS) {
    return new Front(atS, 0, 0, last, doubt, flow, intervalS, flowS);
  }

  Front doubting(Point point) {
    return new Front(bankS, sumPa, count, last, point, flow, intervalS, flowS);
  }

  /** With a flow that goes on, or that has just ended when there is none. */
  Front flowing(Flow other) {
    return new Front(bankS, sumPa, count, last, null, other, intervalS, last.atS());
  }

  double meanPa() {
    return sumPa / count;
  }
}

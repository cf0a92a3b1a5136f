package tunwarden.report;

import java.util.List;
import tunwarden.replay.LogRow;
import tunwarden.vessel.Vessel;

/**
 * A logged day with what truly happened.
 *
 * @param rows what a logger wrote
 * @param truth what happened, in order of time
 * @param vessel as its user describes it
 * @param about what was drawn, for the list of faults
 */
record Day(List<LogRow> rows, List<Truth> truth, Vessel vessel, String about) {
  /**
   * What truly happened.
   *
   * @param kind the report's word
   * @param from seconds since the start
   * @param until seconds since the start
   * @param gasKg gas that left; negative when it came in
   */
  record Truth(String kind, double from, double until, double gasKg) {}
}

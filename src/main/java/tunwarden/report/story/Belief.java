package tunwarden.report.story;

import java.util.Optional;
import tunwarden.report.analysis.Bins;
import tunwarden.report.hindsight.Smoother;

/**
 * What the liquid held over the log: the backward look where there is one, else the running
 * estimate.
 *
 * @param bins the running estimate
 * @param smoother the backward look, if it can be had and is wanted
 */
public record Belief(Bins bins, Optional<Smoother> smoother) {
  /** Dissolved CO2 in one stretch, kg/m³; NaN where unknown. */
  public double dissolved(int bin) {
    return smoother.map(s -> s.at(bins.middleMs(bin))[0]).orElse(bins.dissolved(bin));
  }

  /** Its 95 % half-width, kg/m³. */
  public double u95(int bin) {
    return smoother.map(s -> s.at(bins.middleMs(bin))[1]).orElse(bins.u95(bin));
  }
}

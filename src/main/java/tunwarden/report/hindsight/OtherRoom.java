package tunwarden.report.hindsight;

import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.physics.gas.Gas;
import tunwarden.report.analysis.Analysis;

/**
 * Whether a vessel of another size or fill than stated would explain the log far better. How much a
 * shut vessel's pressure answers warmth, and comes back after a vent, hangs on its headspace.
 */
public final class OtherRoom {
  /** Headspaces over the stated one that a wrong size or fill would make. */
  private static final double[] SHARES = {0.1, 0.2, 0.35, 0.6, 1.7, 3, 5, 10, 20};

  private static final double[] WITHIN_SIGMAS = {-2.2, -1.1, 0, 1.1, 2.2};

  /** Nearer than this the accuracy of the fill allows it, in standard deviations. */
  private static final double FAR = 3;

  /** By so much the log of the likelihood must be greater. Judgement. */
  private static final double FAR_BETTER = 12;

  private OtherRoom() {}

  /** The headspace over the stated one, to a factor of two; empty where the stated one will do. */
  public static OptionalDouble share(Analysis analysis) {
    Optional<Course> course =
        analysis.vessel().gas().fraction(Gas.CO2) < 0.99 || analysis.bins().size() < 12
            ? Optional.empty()
            : Course.of(analysis);
    if (course.isEmpty()) {
      return OptionalDouble.empty();
    }
    Search search = new Search(analysis.vessel(), course.get());
    double stated = Double.NEGATIVE_INFINITY;
    for (double sigmas : WITHIN_SIGMAS) {
      stated = Math.max(stated, search.best(sigmas * search.roomSigma()));
    }
    double best = stated + FAR_BETTER;
    OptionalDouble share = OptionalDouble.empty();
    for (double each : SHARES) {
      boolean allowed = Math.abs(Math.log(each)) < FAR * search.roomSigma();
      double log = allowed ? stated : search.best(Math.log(each));
      if (log > best) {
        best = log;
        share = OptionalDouble.of(each);
      }
    }
    return share;
  }
}

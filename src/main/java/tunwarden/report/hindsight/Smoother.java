package tunwarden.report.hindsight;

import java.util.Optional;
import tunwarden.physics.gas.Gas;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.ReportRow;

/**
 * Looks back with the whole log in hand. Whatever a valve does, the liquid follows the headspace at
 * first order: dC/dt = kLa (C* − C), and C* is known at all times from pressure and temperature.
 * Held pressure hides C while it lasts; once the vessel is shut, the headspace shows it. So
 * assumptions about rate, headspace and air are weighed by how well they explain all pressures
 * ({@link HeadspaceFilter}), each with what follows for the liquid's beginning; what the liquid
 * held is their weighted mean and spread ({@link Band}).
 */
public final class Smoother {
  private static final int LEAST_BINS = 12;

  /** From this share of weight on, what the look back does not go by is too likely. */
  private static final double MOST_ODD = 0.2;

  private static final double PURE = 0.99;

  private final Course course;
  private final Band band;

  private Smoother(Course course, Band band) {
    this.course = course;
    this.band = band;
  }

  /**
   * The backward look; empty for a short log, another gas than CO2, and where fermentation or a
   * headspace full of air explains the pressure better.
   */
  public static Optional<Smoother> over(Analysis analysis) {
    boolean pure = analysis.vessel().contents().gas().fraction(Gas.CO2) > PURE;
    if (!pure || analysis.bins().size() < LEAST_BINS) {
      return Optional.empty();
    }
    Optional<Course> course = Course.of(analysis);
    if (course.isEmpty()) {
      return Optional.empty();
    }
    Search search = new Search(analysis.vessel(), course.get());
    Band band = search.band();
    boolean odd = band.oddShare() > MOST_ODD || band.least(0) > search.richest();
    return odd ? Optional.empty() : Optional.of(new Smoother(course.get(), band));
  }

  /** The row with the belief the whole log gives. */
  public ReportRow smooth(ReportRow row) {
    if (Double.isNaN(row.dissolvedKgPerM3())) {
      return row;
    }
    double at = Math.max(0, Math.min(course.place(row.time().toEpochMilli()), course.size - 1.0));
    int k = (int) Math.min(at, course.size - 2.0);
    double share = at - k;
    double kgPerM3 = band.mean(k) + share * (band.mean(k + 1) - band.mean(k));
    double u95 = band.u95(k) + share * (band.u95(k + 1) - band.u95(k));
    return row.withDissolved(kgPerM3, u95);
  }

  /** The belief at a time, milliseconds since 1970: content and half-width, kg/m³. */
  public double[] at(long ms) {
    int k = (int) Math.round(Math.max(0, Math.min(course.place(ms), course.size - 1.0)));
    return new double[] {band.mean(k), band.u95(k)};
  }
}

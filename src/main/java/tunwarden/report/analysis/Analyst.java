package tunwarden.report.analysis;

import java.time.Instant;
import java.util.Optional;
import tunwarden.assess.Margins;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Mode;
import tunwarden.estimate.State;
import tunwarden.estimate.Step;
import tunwarden.reading.Reading;
import tunwarden.replay.LogRow;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/**
 * Reads one vessel's rows once, in order, and keeps what a report needs, in bounded memory. The
 * {@link Sifter} sees every row first, on another thread if that is wanted.
 */
public final class Analyst {
  private final Vessel vessel;
  private final Estimator estimator;
  private final Sifter sifter;
  private final EventBook book = new EventBook();
  private final long[] secondsIn = new long[Mode.values().length];
  private final Extremes extremes = new Extremes();
  private State state;
  private Estimate estimate;
  private Bins bins;
  private ReportRow last;
  private long rows;

  /** An analyst that has read nothing yet. */
  public Analyst(Vessel vessel, Estimator estimator) {
    this.vessel = vessel;
    this.estimator = estimator;
    this.sifter = new Sifter(vessel);
    this.state = estimator.begin(vessel);
  }

  /** Has to see every row before {@link #take(Sifted)} does. */
  public Sifter sifter() {
    return sifter;
  }

  /** Takes in the next row and says what is known after it. */
  public ReportRow take(LogRow row) {
    return take(sifter.sift(row));
  }

  /** Takes in the next sifted row and says what is known after it. */
  public ReportRow take(Sifted row) {
    rows++;
    row.belated().forEach(this::step);
    idleUntil(row.time());
    row.news().forEach(this::step);
    ReportRow known = known(row);
    keep(known);
    return known;
  }

  private void step(Reading reading) {
    take(estimator.step(state, reading));
  }

  private void take(Step step) {
    state = step.next();
    estimate = state.estimate().orElse(null);
    book.note(step.events());
  }

  /** A silence is told to the estimator in ever longer steps, so that it can age its belief. */
  private void idleUntil(Instant next) {
    if (last == null) {
      return;
    }
    long silent = next.getEpochSecond() - last.time().getEpochSecond();
    for (long after = Sifter.SILENCE_S; after < silent; after *= 2) {
      take(estimator.idle(state, last.time().plusSeconds(after)));
    }
  }

  private ReportRow known(Sifted row) {
    Optional<ReliefSetting> relief = vessel.limits().relief();
    boolean margin = relief.isPresent() && !row.quality().isBad() && !Double.isNaN(row.paGauge());
    double marginPa =
        margin
            ? Margins.reliefPa(relief.get(), row.paGauge(), vessel.accuracy().pressureU95Pa())
            : Double.NaN;
    boolean known = estimate != null;
    return new ReportRow(
        row.time(),
        row.paGauge(),
        row.kelvin(),
        known ? estimate.dissolvedKgPerM3() : Double.NaN,
        known ? estimate.dissolvedU95KgPerM3() : Double.NaN,
        known ? estimate.equilibriumKgPerM3() : Double.NaN,
        known ? estimate.settled() : Double.NaN,
        marginPa,
        row.quality());
  }

  private void keep(ReportRow row) {
    bins = bins == null ? new Bins(row.time().toEpochMilli()) : bins;
    bins.add(
        row,
        estimate == null ? 0 : estimate.gasMadeKgPerM3PerS(),
        estimate != null && estimate.mode() == Mode.SEALED);
    extremes.take(row);
    if (last != null && estimate != null) {
      long seconds = row.time().getEpochSecond() - last.time().getEpochSecond();
      secondsIn[estimate.mode().ordinal()] += seconds;
    }
    last = row;
  }

  /** Rows taken in so far. */
  public long rows() {
    return rows;
  }

  /** What the log says as a whole; call once, after the last row. */
  public Analysis finish() {
    sifter.rest().forEach(this::step);
    return new Analysis(
        vessel,
        rows,
        extremes,
        book.merged(sifter.events()),
        bins,
        sifter.signals(),
        sifter.laboratory(),
        state,
        secondsIn);
  }
}

package tunwarden.report.analysis;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Margins;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.estimate.State;
import tunwarden.estimate.Step;
import tunwarden.reading.Fault;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;
import tunwarden.report.find.EventFinder;
import tunwarden.report.find.Point;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Reads one vessel's rows once, in order, and keeps what a report needs, in bounded memory. */
public final class Analyst {
  private static final long IDLE_FROM_S = 60;

  private final Vessel vessel;
  private final Estimator estimator;
  private final EventFinder finder;
  private final EventBook book = new EventBook();
  private final List<Event> marks = new ArrayList<>();
  private final SignalHealth pressureHealth = new SignalHealth();
  private final SignalHealth temperatureHealth = new SignalHealth();
  private final long[] secondsIn = new long[Mode.values().length];
  private final Extremes extremes = new Extremes();
  private State state;
  private Bins bins;
  private ReportRow last;
  private double kelvin = Double.NaN;
  private long rows;

  /** An analyst that has read nothing yet. */
  public Analyst(Vessel vessel, Estimator estimator) {
    this.vessel = vessel;
    this.estimator = estimator;
    this.finder = new EventFinder(vessel);
    this.state = estimator.begin(vessel);
  }

  /** Takes in the next row and says what is known after it. */
  public ReportRow take(LogRow row) {
    rows++;
    idleUntil(row.time());
    double paGauge = Double.NaN;
    Quality quality = Quality.NO_ANSWER;
    for (Sample sample : row.samples()) {
      Step step = estimator.step(state, sample);
      state = step.next();
      book.note(step.events());
      if (sample instanceof Mark mark) {
        marks.add(mark(mark));
      } else if (sample instanceof Fault fault) {
        quality = fault.quantity() == Quantity.PRESSURE ? fault.quality() : quality;
        health(fault.quantity()).ifPresent(h -> h.fault(fault.quality()));
      } else if (sample instanceof Reading reading) {
        health(reading.quantity()).ifPresent(h -> h.value(reading.value(), step.quality()));
        if (reading.quantity() == Quantity.PRESSURE) {
          paGauge = reading.value();
          quality = step.quality();
        } else if (reading.quantity() == Quantity.TEMPERATURE) {
          kelvin = reading.value();
        }
      }
    }
    ReportRow known = known(row.time(), paGauge, quality);
    keep(known);
    return known;
  }

  private Optional<SignalHealth> health(Quantity quantity) {
    return switch (quantity) {
      case PRESSURE -> Optional.of(pressureHealth);
      case TEMPERATURE -> Optional.of(temperatureHealth);
      default -> Optional.empty();
    };
  }

  /** A silence is told to the estimator in ever longer steps, so that it can age its belief. */
  private void idleUntil(Instant next) {
    if (last == null) {
      return;
    }
    long silent = Duration.between(last.time(), next).toSeconds();
    for (long after = IDLE_FROM_S; after < silent; after *= 2) {
      Step step = estimator.idle(state, last.time().plusSeconds(after));
      state = step.next();
      book.note(step.events());
    }
  }

  private ReportRow known(Instant time, double paGauge, Quality quality) {
    Optional<Estimate> estimate = state.estimate();
    Optional<ReliefSetting> relief = vessel.limits().relief();
    boolean margin = relief.isPresent() && !quality.isBad() && !Double.isNaN(paGauge);
    double marginPa =
        margin
            ? Margins.reliefPa(relief.get(), paGauge, vessel.accuracy().pressureU95Pa())
            : Double.NaN;
    return new ReportRow(
        time,
        paGauge,
        kelvin,
        estimate.map(Estimate::dissolvedKgPerM3).orElse(Double.NaN),
        estimate.map(Estimate::dissolvedU95KgPerM3).orElse(Double.NaN),
        estimate.map(Estimate::equilibriumKgPerM3).orElse(Double.NaN),
        estimate.map(Estimate::settled).orElse(Double.NaN),
        marginPa,
        quality);
  }

  private void keep(ReportRow row) {
    bins = bins == null ? new Bins(row.time().toEpochMilli()) : bins;
    Optional<Estimate> estimate = state.estimate();
    bins.add(
        row,
        estimate.map(Estimate::gasMadeKgPerM3PerS).orElse(0.0),
        estimate.map(Estimate::mode).filter(mode -> mode == Mode.SEALED).isPresent());
    if (!Double.isNaN(row.paGauge()) && row.quality().level() != Quality.Level.BAD) {
      finder.add(new Point(row.time().toEpochMilli(), row.paGauge(), row.temperatureK()));
    }
    extremes.take(row);
    if (last != null && state.estimate().isPresent()) {
      long seconds = Duration.between(last.time(), row.time()).toSeconds();
      secondsIn[state.estimate().get().mode().ordinal()] += seconds;
    }
    last = row;
  }

  private Event mark(Mark mark) {
    return new Event(
        EventKind.MARK,
        mark.vessel(),
        mark.time(),
        mark.time(),
        false,
        Double.NaN,
        Double.NaN,
        0,
        1,
        "written in the log: " + mark.text());
  }

  /** Rows taken in so far. */
  public long rows() {
    return rows;
  }

  /** What the log says as a whole; call once, after the last row. */
  public Analysis finish() {
    List<Event> found = new ArrayList<>(finder.finish());
    found.addAll(marks);
    Analysis.Signals signals =
        new Analysis.Signals(
            pressureHealth,
            temperatureHealth,
            finder.usualIntervalS(),
            finder.pressureNoisePa(),
            finder.pressureStepPa());
    return new Analysis(
        vessel, rows, extremes, book.merged(found), bins, signals, state, secondsIn);
  }
}

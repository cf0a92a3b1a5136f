package tunwarden.report.analysis;

import java.time.Instant;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.assess.Margins;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.estimate.State;
import tunwarden.estimate.gate.Gates;
import tunwarden.estimate.gate.Track;
import tunwarden.estimate.gate.Verdict;
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

/**
 * Reads one vessel's rows once, in order, and keeps what a report needs, in bounded memory. Gates
 * and the search for events see every row; the estimator sees them thinned.
 */
public final class Analyst {
  private static final long IDLE_FROM_S = 60;

  private final Vessel vessel;
  private final Thinner thinner;
  private final EventFinder finder;
  private final EventBook book = new EventBook();
  private final List<Event> marks = new ArrayList<>();
  private final Map<Quantity, Track> tracks = new EnumMap<>(Quantity.class);
  private final SignalHealth pressureHealth = new SignalHealth();
  private final SignalHealth temperatureHealth = new SignalHealth();
  private final long[] secondsIn = new long[Mode.values().length];
  private final Extremes extremes = new Extremes();
  private State state;
  private Estimate estimate;
  private Bins bins;
  private ReportRow last;
  private double paGauge;
  private Quality quality;
  private double kelvin = Double.NaN;
  private long rows;

  /** An analyst that has read nothing yet. */
  public Analyst(Vessel vessel, Estimator estimator) {
    this.vessel = vessel;
    this.thinner = new Thinner(vessel, estimator, book::note);
    this.finder = new EventFinder(vessel);
  }

  /** Takes in the next row and says what is known after it. */
  public ReportRow take(LogRow row) {
    rows++;
    idleUntil(row.time());
    paGauge = Double.NaN;
    quality = Quality.NO_ANSWER;
    for (Sample sample : row.samples()) {
      if (sample instanceof Reading reading) {
        take(reading);
      } else if (sample instanceof Mark mark) {
        marks.add(mark(mark));
      } else if (sample instanceof Fault fault) {
        quality = fault.quantity() == Quantity.PRESSURE ? fault.quality() : quality;
        health(fault.quantity()).ifPresent(h -> h.fault(fault.quality()));
      }
    }
    believe();
    ReportRow known = known(row.time());
    keep(known);
    return known;
  }

  private void take(Reading reading) {
    switch (reading.quantity()) {
      case PRESSURE -> {
        Quality judged = judge(reading);
        pressureHealth.value(reading.value(), judged);
        paGauge = reading.value();
        quality = judged;
      }
      case TEMPERATURE -> {
        temperatureHealth.value(reading.value(), judge(reading));
        kelvin = reading.value();
      }
      case DISSOLVED -> thinner.rare(reading);
      default -> judge(reading);
    }
  }

  /** The gates' word on a reading; what is usable goes on. */
  private Quality judge(Reading reading) {
    Track track = tracks.getOrDefault(reading.quantity(), Track.EMPTY);
    Verdict verdict = Gates.judge(track, reading);
    tracks.put(reading.quantity(), verdict.track());
    if (verdict.usable()) {
      Reading usable =
          verdict.quality() == reading.quality() ? reading : reading.withQuality(verdict.quality());
      if (reading.quantity() == Quantity.PRESSURE) {
        thinner.pressure(usable, finder.tellingPa());
      } else {
        thinner.beside(usable);
      }
    }
    return verdict.quality();
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
    long silent = next.getEpochSecond() - last.time().getEpochSecond();
    for (long after = IDLE_FROM_S; after < silent; after *= 2) {
      thinner.idle(last.time().plusSeconds(after));
    }
  }

  private void believe() {
    if (state != thinner.state()) {
      state = thinner.state();
      estimate = state.estimate().orElse(null);
    }
  }

  private ReportRow known(Instant time) {
    Optional<ReliefSetting> relief = vessel.limits().relief();
    boolean margin = relief.isPresent() && !quality.isBad() && !Double.isNaN(paGauge);
    double marginPa =
        margin
            ? Margins.reliefPa(relief.get(), paGauge, vessel.accuracy().pressureU95Pa())
            : Double.NaN;
    boolean known = estimate != null;
    return new ReportRow(
        time,
        paGauge,
        kelvin,
        known ? estimate.dissolvedKgPerM3() : Double.NaN,
        known ? estimate.dissolvedU95KgPerM3() : Double.NaN,
        known ? estimate.equilibriumKgPerM3() : Double.NaN,
        known ? estimate.settled() : Double.NaN,
        marginPa,
        quality);
  }

  private void keep(ReportRow row) {
    bins = bins == null ? new Bins(row.time().toEpochMilli()) : bins;
    bins.add(
        row,
        estimate == null ? 0 : estimate.gasMadeKgPerM3PerS(),
        estimate != null && estimate.mode() == Mode.SEALED);
    if (!Double.isNaN(row.paGauge()) && row.quality().level() != Quality.Level.BAD) {
      finder.add(new Point(row.time().toEpochMilli(), row.paGauge(), row.temperatureK()));
    }
    extremes.take(row);
    if (last != null && estimate != null) {
      long seconds = row.time().getEpochSecond() - last.time().getEpochSecond();
      secondsIn[estimate.mode().ordinal()] += seconds;
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
    thinner.flush();
    believe();
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

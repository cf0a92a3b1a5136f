package tunwarden.report.analysis;

import java.time.Instant;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
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
import tunwarden.vessel.Vessel;

/**
 * What is done to every row of a log, at full rate: the gates judge it, the search for events looks
 * at it, the health of the instruments is counted, and the few readings that carry news are picked
 * for the estimator.
 */
public final class Sifter {
  /** A silence longer than this is told to the estimator, s. */
  static final long SILENCE_S = 60;

  private final EventFinder finder;
  private final Thinner thinner = new Thinner();
  private final List<Event> marks = new ArrayList<>();
  private final List<Reading> laboratory = new ArrayList<>();
  private final Map<Quantity, Track> tracks = new EnumMap<>(Quantity.class);
  private final SignalHealth pressureHealth = new SignalHealth();
  private final SignalHealth temperatureHealth = new SignalHealth();
  private Instant last;
  private double paGauge;
  private Quality quality;
  private double kelvin = Double.NaN;

  Sifter(Vessel vessel) {
    this.finder = new EventFinder(vessel);
  }

  /** Takes in the next row. */
  public Sifted sift(LogRow row) {
    boolean silent =
        last != null && row.time().getEpochSecond() - last.getEpochSecond() > SILENCE_S;
    if (silent) {
      thinner.flush();
    }
    List<Reading> belated = silent ? thinner.take() : List.of();
    last = row.time();
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
    if (!Double.isNaN(paGauge) && !quality.isBad()) {
      finder.add(new Point(row.time().toEpochMilli(), paGauge, kelvin));
    }
    return new Sifted(row.time(), paGauge, kelvin, quality, belated, thinner.take());
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
      case DISSOLVED -> {
        thinner.rare(reading);
        laboratory.add(reading);
      }
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

  /** The readings that were still kept; call once, after the last row. */
  List<Reading> rest() {
    thinner.flush();
    return thinner.take();
  }

  /** What the readings alone tell; call once, after the last row. */
  List<Event> events() {
    List<Event> found = new ArrayList<>(finder.finish());
    found.addAll(marks);
    return found;
  }

  /** Values of the dissolved gas that were entered. */
  List<Reading> laboratory() {
    return laboratory;
  }

  /** How the instruments behaved. */
  Analysis.Signals signals() {
    return new Analysis.Signals(
        pressureHealth,
        temperatureHealth,
        finder.usualIntervalS(),
        finder.pressureNoisePa(),
        finder.pressureStepPa());
  }
}

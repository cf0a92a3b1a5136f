package tunwarden.rehearse;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import tunwarden.reading.Mark;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.units.Constants;
import tunwarden.units.Unit;
import tunwarden.vessel.Vessel;

/**
 * A simulated vessel played from its beginning: the same scenario, seed, start and interval give
 * the same rows.
 */
public final class Rehearsal implements RowSource {
  private final Script script;
  private final Instant start;
  private final long intervalS;
  private final long lastS;
  private long nextS;

  private Rehearsal(Script script, Instant start, long intervalS, long lastS) {
    this.script = script;
    this.start = start;
    this.intervalS = intervalS;
    this.lastS = lastS;
  }

  /** A rehearsal as long, and with rows as far apart, as its scenario is usually logged. */
  public static Rehearsal logged(Scenario scenario, long seed, Instant start) {
    Script script = script(scenario, seed);
    return new Rehearsal(script, start, script.interval().toSeconds(), script.length().toSeconds());
  }

  /** A rehearsal without end, with rows that far apart (whole seconds). */
  public static Rehearsal endless(Scenario scenario, long seed, Instant start, Duration interval) {
    return new Rehearsal(
        script(scenario, seed), start, Math.max(1, interval.toSeconds()), Long.MAX_VALUE);
  }

  private static Script script(Scenario scenario, long seed) {
    return scenario.script(new Random(seed * 1_000_003 + scenario.ordinal()));
  }

  /** The vessel as its user would describe it. */
  public Vessel vessel() {
    return script.described();
  }

  /** The vessel as it truly is; nothing outside a rehearsal can know it. */
  public SimulatedVessel truth() {
    return script.vessel();
  }

  /** Length of the log that is usually made of the scenario. */
  public Duration length() {
    return script.length();
  }

  @Override
  public LogRow next() {
    if (nextS > lastS) {
      return null;
    }
    long from = nextS == 0 ? 0 : nextS - intervalS;
    for (long second = from; second < nextS; second++) {
      script.second(second);
    }
    Instant time = start.plusSeconds(nextS);
    String id = vessel().id();
    List<Sample> samples = new ArrayList<>(3);
    Optional<String> remark = script.remarkWithin(nextS - intervalS, nextS);
    remark.ifPresent(text -> samples.add(new Mark(time, id, text)));
    double celsius = Unit.CELSIUS.fromSi(script.vessel().temperatureK());
    double shownK = script.sensors().temperature().show(celsius) + Constants.ZERO_CELSIUS_K;
    double shownBar = script.sensors().pressure().show(Unit.BAR.fromSi(script.vessel().paGauge()));
    samples.add(Reading.good(time, id, Quantity.TEMPERATURE, shownK));
    samples.add(Reading.good(time, id, Quantity.PRESSURE, Unit.BAR.toSi(shownBar)));
    nextS += intervalS;
    return new LogRow(0, time, id, samples);
  }
}

package tunwarden.rehearse;

import java.time.Instant;
import java.util.List;
import tunwarden.reading.Quantity;
import tunwarden.replay.LogRow;
import tunwarden.replay.LogWriter;

/** Writes a whole rehearsal as a log that says what it is. */
public final class RehearsalLog {
  /** Data time at which rehearsed logs begin, so that the same command gives the same bytes. */
  public static final Instant START = Instant.parse("2026-03-02T06:00:00Z");

  private RehearsalLog() {}

  /** Writes the log of one scenario. */
  public static void write(Scenario scenario, long seed, Appendable out) {
    Rehearsal rehearsal = Rehearsal.logged(scenario, seed, START);
    LogWriter.Columns columns =
        new LogWriter.Columns(List.of(Quantity.PRESSURE, Quantity.TEMPERATURE), true, true);
    LogWriter writer = new LogWriter(out, columns);
    writer.comment("simulated, not measured: " + scenario.words());
    writer.comment(
        "made by: tunwarden rehearse " + scenario.word() + " --seed " + seed + " --log FILE");
    writer.comment(describe(rehearsal));
    writer.header();
    for (LogRow row = rehearsal.next(); row != null; row = rehearsal.next()) {
      writer.write(row);
    }
  }

  private static String describe(Rehearsal rehearsal) {
    return "vessel "
        + rehearsal.vessel().id()
        + ": --volume '"
        + Math.round(rehearsal.vessel().volumeM3() * 1000)
        + " L' --fill '"
        + Math.round(rehearsal.vessel().fillM3() * 1000)
        + " L' --liquid beer --relief '1.5 bar' --tolerance '0.1 bar' --limit '2.0 bar'";
  }
}

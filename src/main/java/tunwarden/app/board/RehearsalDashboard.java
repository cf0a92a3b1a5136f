package tunwarden.app.board;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import tunwarden.alarm.AlarmSettings;
import tunwarden.rehearse.RehearsalCellar;
import tunwarden.screen.model.Origin;

/** The dashboard without instruments: three simulated vessels, marked as a rehearsal throughout. */
public final class RehearsalDashboard {
  private static final Instant BEGIN = Instant.parse("2026-03-02T05:00:00Z");
  private static final Duration ROW = Duration.ofSeconds(10);
  private static final Duration SKIP = Duration.ofHours(2);
  private static final double PACE = 60;
  private static final long SEED = 1;

  private RehearsalDashboard() {}

  /** Plays the rehearsal cellar until the person quits. */
  public static void run(Front front) throws IOException {
    RehearsalCellar cellar = new RehearsalCellar(SEED, BEGIN, ROW);
    Playback.run(
        new Playback.Show(
            RehearsalCellar.PLACE,
            Origin.REHEARSAL,
            cellar.vessels(),
            cellar,
            PACE,
            AlarmSettings.DEFAULT,
            SKIP),
        Playback.Helpers.NONE,
        front);
  }
}

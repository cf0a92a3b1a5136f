package tunwarden.app.board;

import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import org.slf4j.LoggerFactory;
import tunwarden.alarm.AlarmSettings;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.config.PortPlans;
import tunwarden.rehearse.RehearsalCellar;
import tunwarden.screen.model.Origin;
import tunwarden.screen.terminal.Dashboard;
import tunwarden.vessel.Vessel;

/**
 * Loads what a first frame needs, on a second core, while the first still reads arguments and
 * files: reads a cellar file, sets up the log and draws the board of an unread cellar into memory.
 * Nothing depends on it but the time of the first frame.
 */
public final class HeadStart {
  private static final String CELLAR =
      """
      [vessel.V1]
      volume = "2000 L"
      fill = "1800 L"
      liquid = { kind = "beer" }
      limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
      [vessel.V1.readings]
      pressure = { device = "text-line", port = "P", field = "P" }
      temperature = { device = "text-line", port = "P", field = "T" }
      """;

  private HeadStart() {}

  /**
   * Begins, and returns at once.
   *
   * @param instruments whether a cellar file is going to be read
   */
  public static void begin(boolean instruments) {
    Thread thread = new Thread(() -> load(instruments), "head start");
    thread.setDaemon(true);
    thread.setUncaughtExceptionHandler(
        (on, e) -> LoggerFactory.getLogger(HeadStart.class).warn("no head start", e));
    thread.start();
  }

  private static void load(boolean instruments) {
    List<Vessel> vessels =
        instruments
            ? readCellar()
            : new RehearsalCellar(0, Instant.EPOCH, Duration.ofSeconds(1)).vessels();
    LoggerFactory.getILoggerFactory();
    BoardKeeper.Frame frame =
        new BoardKeeper.Frame(
            Origin.REHEARSAL,
            ZoneOffset.UTC,
            AlarmSettings.DEFAULT.stale(),
            () -> Instant.EPOCH,
            Optional::empty,
            Optional::empty);
    Assembly unread =
        Assembly.of(
            vessels,
            AlarmSettings.DEFAULT,
            frame,
            (vessel, quantity) -> SignalSource.BY_HAND,
            List.of(),
            List.of());
    Dashboard.drawInMemory(unread.board().latest());
  }

  private static List<Vessel> readCellar() {
    Cellar cellar = CellarFile.parse(Path.of("head start"), CELLAR);
    PortPlans.of(cellar);
    return cellar.vessels();
  }

  /** Loads everything at once, for a list of the classes that a dashboard needs. */
  public static void main(String[] args) {
    load(true);
    load(false);
  }
}

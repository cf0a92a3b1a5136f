package tunwarden.app.board;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BiFunction;
import java.util.function.Consumer;
import java.util.function.Supplier;
import tunwarden.alarm.AlarmSettings;
import tunwarden.replay.ReplayDriver;
import tunwarden.replay.ReplayPlayer;
import tunwarden.replay.RowSource;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Progress;
import tunwarden.screen.model.ReplayStatus;
import tunwarden.screen.model.ReplayStatus.TimeMark;
import tunwarden.screen.terminal.Dashboard;
import tunwarden.vessel.Vessel;

/** The dashboard over rows that are played at a pace: a log, or a rehearsal. */
final class Playback {
  private static final Duration TICK = Duration.ofSeconds(10);
  private static final DateTimeFormatter DAY_AND_MINUTE =
      DateTimeFormatter.ofPattern("MM-dd HH:mm", Locale.ROOT);

  private final Show show;
  private final Front front;
  private final AtomicReference<ReplayDriver> driver = new AtomicReference<>();
  private final AtomicReference<StationTarget> target = new AtomicReference<>();

  /**
   * What is played.
   *
   * @param name of the log or the scenario
   * @param origin replay or rehearsal
   * @param vessels their descriptions
   * @param rows opened afresh whenever the replay goes back
   * @param pace data seconds per real second
   * @param alarms alarm settings
   * @param skip data time played as fast as it goes to begin with, so that charts are not empty
   */
  record Show(
      String name,
      Origin origin,
      List<Vessel> vessels,
      RowSource.Supplier rows,
      double pace,
      AlarmSettings alarms,
      Duration skip) {}

  /**
   * What runs beside the playing.
   *
   * @param begin starts it, once the screen is up
   * @param last last time of the log as far as known
   * @param marks times at which something happened, as far as known
   * @param progress long work under way
   * @param stopWork stops it
   * @param report writes a report of a vessel, says where, and later tells how it ended
   */
  record Helpers(
      Runnable begin,
      Supplier<Optional<Instant>> last,
      Supplier<List<TimeMark>> marks,
      Supplier<Optional<Progress>> progress,
      Runnable stopWork,
      BiFunction<String, Consumer<String>, String> report) {
    static final Helpers NONE =
        new Helpers(
            () -> {},
            Optional::empty,
            List::of,
            Optional::empty,
            () -> {},
            (vessel, told) -> "a report is made from a log: tunwarden report LOG");
  }

  private Playback(Show show, Front front) {
    this.show = show;
    this.front = front;
  }

  /** Plays until the person quits. */
  static void run(Show show, Helpers helpers, Front front) throws IOException {
    new Playback(show, front).run(helpers);
  }

  private void run(Helpers helpers) throws IOException {
    Assembly assembly =
        Assembly.of(
            show.vessels(),
            show.alarms(),
            frame(helpers),
            (vessel, quantity) -> new SignalSource(quantity.column(), show.name(), () -> ""),
            List.of(),
            List.of());
    StationTarget fed = new StationTarget(assembly, show.vessels().size());
    target.set(fed);
    ReplayPlayer player = new ReplayPlayer(show.rows(), fed, TICK);
    fed.begin(player.start());
    try (ReplayDriver running =
        new ReplayDriver(player, show.pace(), System::nanoTime, ReplayDriver.Waiting.onMonitor())) {
      driver.set(running);
      PlaybackDesk desk = new PlaybackDesk(assembly, fed, running, helpers, front.looks()::keep);
      Dashboard.run(
          assembly.board()::latest, desk, front.options(() -> begin(running, player, helpers)));
    }
  }

  private void begin(ReplayDriver running, ReplayPlayer player, Helpers helpers) {
    if (!show.skip().isZero()) {
      running.seek(player.start().plus(show.skip()));
    }
    running.start();
    helpers.begin().run();
  }

  private BoardKeeper.Frame frame(Helpers helpers) {
    return new BoardKeeper.Frame(
        show.origin(),
        front.zone(),
        show.alarms().stale(),
        () -> target.get().reached(),
        () -> status(helpers),
        () -> seeking().or(helpers.progress()));
  }

  private Optional<Progress> seeking() {
    return driver.get().status().seek().flatMap(this::seeking);
  }

  private Optional<Progress> seeking(tunwarden.replay.ReplayStatus.Seek seek) {
    double whole = Math.max(1, Duration.between(seek.from(), seek.to()).toSeconds());
    double done = Duration.between(seek.from(), target.get().reached()).toSeconds();
    Duration spent = Duration.ofNanos(System.nanoTime() - seek.sinceNanos());
    String what = show.origin() == Origin.REPLAY ? "going to " : "playing up to ";
    return Progress.after(
        spent, what + DAY_AND_MINUTE.format(seek.to().atZone(front.zone())), done / whole);
  }

  /** A rehearsal has no end to show on a time bar. */
  private Optional<ReplayStatus> status(Helpers helpers) {
    tunwarden.replay.ReplayStatus now = driver.get().status();
    if (show.origin() != Origin.REPLAY) {
      return Optional.empty();
    }
    Instant at = target.get().reached();
    Instant end = helpers.last().get().filter(at::isBefore).orElse(at);
    return Optional.of(
        new ReplayStatus(
            show.name(),
            now.pace(),
            now.paused(),
            now.start(),
            end,
            at,
            now.failure().orElse(""),
            helpers.marks().get()));
  }
}

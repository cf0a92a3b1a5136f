package tunwarden.replay;

import java.io.Closeable;
import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.function.LongSupplier;

/**
 * The one thread of a replay: turns real time into data time and has the player feed its target.
 * Commands may come from any thread and take effect within one turn of the loop.
 */
public final class ReplayDriver implements Closeable {
  private static final long ROWS_PER_TURN = 2_000;

  /** Fewer on the way to another time, so that it can be followed and stopped. */
  private static final long ROWS_PER_SEEK_TURN = 50;

  private static final long LONGEST_WAIT_NANOS = 200_000_000L;

  /** How the driver passes real time; a test can let it pass at once. */
  public interface Waiting {
    /** Waits at most that long, or until {@link #wake}. */
    void await(long nanos) throws InterruptedException;

    /** Ends a wait early. */
    void wake();

    /** Waits on a monitor. */
    static Waiting onMonitor() {
      return new MonitorWaiting();
    }
  }

  private interface Command {
    void run() throws IOException;
  }

  private final ReplayPlayer player;
  private final Waiting waiting;
  private final LongSupplier nanos;
  private final ConcurrentLinkedQueue<Command> commands = new ConcurrentLinkedQueue<>();
  private volatile ReplayStatus status;
  private volatile boolean closing;
  private volatile boolean seekStopped;
  private Optional<ReplayStatus.Seek> seek = Optional.empty();
  private ReplayClock clock;
  private Thread thread;

  /**
   * A driver that does not run yet.
   *
   * @param player feeds the target; owned by the driver from now on
   * @param pace data seconds per real second
   * @param nanos a monotonic counter such as {@code System::nanoTime}
   * @param waiting how to pass time
   */
  public ReplayDriver(ReplayPlayer player, double pace, LongSupplier nanos, Waiting waiting) {
    this.player = player;
    this.nanos = nanos;
    this.waiting = waiting;
    this.clock = new ReplayClock(player.start(), nanos.getAsLong(), pace, false);
    publish(Optional.empty());
  }

  /** Starts the thread, named {@code replay}. */
  public void start() {
    clock = clock.movedTo(player.at(), nanos.getAsLong());
    thread = new Thread(this::run, "replay");
    thread.setDaemon(true);
    thread.start();
  }

  private void run() {
    try {
      while (!closing) {
        turn();
      }
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    } catch (IOException | BadLogException failed) {
      publish(Optional.of("the replay stopped: " + failed.getMessage()));
    }
  }

  /** One turn: commands, then rows that are due, then a wait. */
  private void turn() throws IOException, InterruptedException {
    for (Command command = commands.poll(); command != null; command = commands.poll()) {
      command.run();
    }
    long now = nanos.getAsLong();
    boolean caughtUp = clock.paused() || player.playTo(clock.dataTime(now), ROWS_PER_TURN);
    if (!caughtUp) {
      // The machine is slower than the pace: data time goes as fast as rows can be fed.
      clock = clock.movedTo(player.at(), nanos.getAsLong());
    } else if (player.isEnded()) {
      clock = clock.withPaused(true, now).movedTo(player.at(), now);
    }
    publish(Optional.empty());
    if (caughtUp && commands.isEmpty()) {
      waiting.await(Math.min(LONGEST_WAIT_NANOS, clock.nanosUntil(player.due(), now)));
    }
  }

  private void publish(Optional<String> failure) {
    status =
        new ReplayStatus(
            player.start(),
            player.at(),
            player.fed(),
            clock.pace(),
            clock.paused(),
            player.isEnded(),
            failure,
            seek);
  }

  /** Where the replay stands; never blocks. */
  public ReplayStatus status() {
    return status;
  }

  /** Stands still, or goes on. */
  public void pause(boolean still) {
    submit(() -> clock = clock.withPaused(still, nanos.getAsLong()));
  }

  /** Changes the pace; a value that is no pace is ignored. */
  public void pace(double dataSecondsPerSecond) {
    if (dataSecondsPerSecond > 0 && dataSecondsPerSecond <= ReplayClock.FASTEST) {
      submit(() -> clock = clock.withPace(dataSecondsPerSecond, nanos.getAsLong()));
    }
  }

  /** Pauses and feeds the rows of the next time. */
  public void step() {
    submit(
        () -> {
          player.step();
          clock = clock.withPaused(true, nanos.getAsLong()).movedTo(player.at(), nanos.getAsLong());
        });
  }

  /** Goes to a data time, forwards or backwards, without waiting in between. */
  public void seek(Instant time) {
    submit(
        () -> {
          seekStopped = false;
          long since = nanos.getAsLong();
          Instant from = player.at();
          do {
            from = player.at().isBefore(from) ? player.at() : from;
            seek = Optional.of(new ReplayStatus.Seek(from, time, since));
            publish(Optional.empty());
          } while (!player.playTo(time, ROWS_PER_SEEK_TURN) && !closing && !seekStopped);
          seek = Optional.empty();
          clock = clock.movedTo(player.at(), nanos.getAsLong());
        });
  }

  /** Ends a seek under way, at the time it has come to. */
  public void stopSeeking() {
    seekStopped = true;
  }

  /** Goes forwards (positive) or backwards by a stretch of data time. */
  public void seekBy(Duration stretch) {
    submit(
        () -> {
          Instant time = player.at().plus(stretch);
          seek(time.isBefore(player.start()) ? player.start() : time);
        });
  }

  private void submit(Command command) {
    commands.add(command);
    waiting.wake();
  }

  /** Stops the thread, waits for it, and closes the log. */
  @Override
  public void close() throws IOException {
    closing = true;
    waiting.wake();
    if (thread != null) {
      try {
        thread.join();
      } catch (InterruptedException interrupted) {
        Thread.currentThread().interrupt();
      }
    }
    player.close();
  }

  private static final class MonitorWaiting implements Waiting {
    private boolean woken;

    @Override
    public synchronized void await(long nanos) throws InterruptedException {
      if (!woken && nanos > 0) {
        long millis = nanos / 1_000_000;
        wait(millis, (int) (nanos % 1_000_000));
      }
      woken = false;
    }

    @Override
    public synchronized void wake() {
      woken = true;
      notifyAll();
    }
  }
}

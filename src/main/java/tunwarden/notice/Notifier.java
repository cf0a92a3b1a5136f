package tunwarden.notice;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import tunwarden.journal.JournalLines;
import tunwarden.journal.JournalReader;
import tunwarden.journal.Recorder;
import tunwarden.journal.disk.Disk;

/**
 * Sends word of alarms that are in the journal. Whoever hands in entries never waits: gathering and
 * every channel have threads of their own.
 */
public final class Notifier implements Recorder.Listener, AutoCloseable {
  private static final Duration WORTH_TELLING = Duration.ofHours(24);
  private static final int MOST_CAUGHT_UP = 1000;
  private static final Duration LAST_WAIT = Duration.ofMillis(500);

  private final InstantSource clock;
  private final Gatherer gatherer;
  private final List<Courier> couriers = new ArrayList<>();
  private final Map<String, String> troubles = new TreeMap<>();
  private final Trouble trouble;
  private final Told told;
  private final ScheduledExecutorService timer =
      Executors.newSingleThreadScheduledExecutor(
          task -> {
            Thread thread = new Thread(task, "notice");
            thread.setDaemon(true);
            return thread;
          });

  /** Hears when word does not get through, and when it does again. */
  @FunctionalInterface
  public interface Trouble {
    void notice(boolean failing, String text);
  }

  /**
   * A notifier that is not running yet.
   *
   * @param folder where undelivered messages wait
   */
  public Notifier(
      List<Channel> channels,
      Disk disk,
      Path folder,
      InstantSource clock,
      Trouble trouble,
      NoticeRules rules)
      throws IOException {
    this(channels, disk, folder, clock, trouble, rules, Courier.Pace.USUAL);
  }

  Notifier(
      List<Channel> channels,
      Disk disk,
      Path folder,
      InstantSource clock,
      Trouble trouble,
      NoticeRules rules,
      Courier.Pace pace)
      throws IOException {
    this.clock = clock;
    this.gatherer = new Gatherer(rules);
    this.trouble = trouble;
    this.told = new Told(disk, folder, channels.stream().map(Channel::name).toList());
    for (Channel channel : channels) {
      Outbox outbox = new Outbox(disk, folder.resolve(channel.name()));
      couriers.add(new Courier(channel, outbox, pace, text -> trouble(channel.name(), text)));
    }
  }

  /** Begins with what was left over from the last run. */
  public void start() {
    couriers.forEach(Courier::start);
    timer.scheduleWithFixedDelay(this::look, 200, 200, TimeUnit.MILLISECONDS);
  }

  @Override
  public void recorded(List<JournalLines.Numbered> entries, boolean durable) {
    synchronized (gatherer) {
      entries.forEach(entry -> gatherer.add(entry, clock.instant()));
    }
  }

  /**
   * Takes in what stands in the journal and nobody was told of, because the program ended before
   * word of it was safe in the outbox. Of long ago nothing is told.
   */
  public void catchUp(JournalReader journal) throws IOException {
    OptionalLong upTo = told.upTo();
    if (upTo.isPresent()) {
      Instant from = clock.instant().minus(WORTH_TELLING);
      long last = upTo.getAsLong();
      recorded(
          journal.find(
              from, n -> n.number() > last && !n.entry().time().isBefore(from), MOST_CAUGHT_UP),
          true);
    }
  }

  private void look() {
    synchronized (gatherer) {
      gatherer.due(clock.instant()).ifPresent(this::hand);
    }
  }

  /** With the gatherer held, so that its last number is that of the message. */
  private void hand(Message message) {
    long number = gatherer.lastNumber();
    couriers.forEach(
        courier -> courier.hand(message, () -> told.stored(courier.channel(), number)));
  }

  private void trouble(String channel, Optional<String> text) {
    synchronized (troubles) {
      if (text.isPresent()) {
        troubles.put(channel, text.get());
      } else {
        troubles.remove(channel);
      }
      String all = String.join("; ", troubles.values());
      trouble.notice(!troubles.isEmpty(), "Word does not get through: " + all + ".");
    }
  }

  /** Keeps on disk what is not delivered; delivery goes on at the next start. */
  @Override
  public void close() {
    timer.shutdownNow();
    synchronized (gatherer) {
      gatherer.flush(clock.instant()).ifPresent(this::hand);
    }
    couriers.forEach(courier -> courier.close(LAST_WAIT));
  }
}

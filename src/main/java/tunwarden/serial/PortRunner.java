package tunwarden.serial;

import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.reading.Quality;
import tunwarden.reading.Sample;
import tunwarden.wire.profile.Speaks;

/**
 * Reads one serial port on a thread of its own, for as long as it is open: opens the port, listens
 * or asks, opens it again within five seconds of its coming back. Samples go to the consumer on
 * this thread, so the consumer must be quick.
 */
public final class PortRunner implements AutoCloseable {
  private static final Logger LOG = LoggerFactory.getLogger(PortRunner.class);
  private static final long FIRST_PAUSE_MS = 250;
  private static final long LONGEST_PAUSE_MS = 2000;
  private static final long JOIN_MS = 3000;
  private static final Duration LOOK_EVERY = Duration.ofSeconds(1);
  private static final Duration LEAST_SILENCE = Duration.ofSeconds(5);
  private static final Duration LONGEST_SILENCE = Duration.ofSeconds(60);

  private final PortPlan plan;
  private final ByteLinkFactory links;
  private final InstantSource clock;
  private final Tally tally;
  private final Desk desk;
  private final Talk talk;
  private final CountDownLatch closing = new CountDownLatch(1);
  private final Thread thread;
  private volatile LinkHealth health;
  private LinkState state = LinkState.STARTING;
  private String detail = "";
  private Instant since;
  private Instant lastHeard;
  private Instant lookedAt;

  /** Prepares a runner; nothing is opened before {@link #start}. */
  public PortRunner(
      PortPlan plan, ByteLinkFactory links, Consumer<Sample> consumer, InstantSource clock) {
    this.plan = plan;
    this.links = links;
    this.clock = clock;
    this.tally = new Tally(plan.speaks());
    this.desk = new Desk(plan, consumer, clock, tally);
    this.talk = Talks.of(plan, desk);
    this.since = clock.instant();
    this.thread = new Thread(this::run, "port " + plan.port());
    this.thread.setDaemon(true);
    publish();
  }

  /** Starts the thread. */
  public void start() {
    thread.start();
  }

  /** The latest picture of the line; safe from any thread. */
  public LinkHealth health() {
    return health;
  }

  /** Stops the thread and closes the port; returns when that is done. */
  @Override
  public void close() {
    closing.countDown();
    try {
      thread.join(JOIN_MS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void run() {
    long pauseMs = FIRST_PAUSE_MS;
    while (!isClosing()) {
      long messagesBefore = tally.messages();
      try {
        session();
      } catch (PortException e) {
        lost(e);
      } catch (RuntimeException e) {
        LOG.error("reading {} failed", plan.port(), e);
        tally.trouble(Trouble.BROKEN, String.valueOf(e.getMessage()), clock.instant());
        become(LinkState.LOST, "reading failed, trying again: " + e.getMessage());
      }
      pauseMs = tally.messages() > messagesBefore ? FIRST_PAUSE_MS : longer(pauseMs);
      pause(pauseMs);
    }
    become(LinkState.CLOSED, "");
  }

  private static long longer(long pauseMs) {
    return Math.min(LONGEST_PAUSE_MS, 2 * pauseMs);
  }

  /** From opening until loss, closing, or a silence so long that a fresh opening may help. */
  private void session() throws PortException {
    ByteLinkFactory.Use use =
        plan.speaks() == Speaks.TEXT_LINES ? ByteLinkFactory.Use.LISTEN : ByteLinkFactory.Use.ASK;
    try (ByteLink link = links.open(plan.port(), plan.line(), use)) {
      settle(link);
      talk.begin();
      lastHeard = clock.instant();
      lookedAt = lastHeard;
      become(LinkState.OPEN, plan.line().words());
      String opened = links.behind(plan.port());
      while (!isClosing() && !deaf()) {
        long before = tally.bytes();
        talk.turn(link);
        if (tally.bytes() > before) {
          lastHeard = clock.instant();
        } else {
          refuseStranger(opened);
        }
        become(silent(LEAST_SILENCE, 5) ? LinkState.SILENT : talk.state(), plan.line().words());
      }
    }
  }

  /**
   * Some drivers never say that a port was pulled: a quiet port is looked up by name once a second.
   */
  private void refuseStranger(String opened) throws PortException {
    Instant now = clock.instant();
    Instant latest = lastHeard.isAfter(lookedAt) ? lastHeard : lookedAt;
    if (Duration.between(latest, now).compareTo(LOOK_EVERY) <= 0) {
      return;
    }
    lookedAt = now;
    if (!links.behind(plan.port()).equals(opened)) {
      throw new PortException(
          PortException.Reason.GONE, plan.port() + " has gone; is it plugged in?");
    }
  }

  private void settle(ByteLink link) throws PortException {
    long end = System.nanoTime() + plan.line().settle().toNanos();
    byte[] waste = new byte[256];
    while (System.nanoTime() - end < 0 && !isClosing()) {
      tally.dropped(link.read(waste, 50));
    }
  }

  private boolean deaf() {
    return silent(LONGEST_SILENCE, 20);
  }

  private boolean silent(Duration least, int periods) {
    Duration byPeriod = plan.bindings().get(0).trim().period().multipliedBy(periods);
    Duration limit = byPeriod.compareTo(least) > 0 ? byPeriod : least;
    return Duration.between(lastHeard, clock.instant()).compareTo(limit) > 0;
  }

  private void lost(PortException e) {
    boolean wasOpen = state.isOpen();
    boolean news = state != LinkState.of(e.reason());
    become(LinkState.of(e.reason()), e.getMessage());
    if (wasOpen) {
      tally.trouble(Trouble.LOST, "", clock.instant());
    }
    if (news) {
      desk.faults(plan.bindings(), Quality.PORT_GONE, e.getMessage());
      LOG.warn("{}", e.getMessage());
    }
    publish();
  }

  private void become(LinkState next, String words) {
    if (next != state) {
      since = clock.instant();
      LOG.info("{}: {}", plan.port(), next.words());
    }
    state = next;
    detail = words;
    publish();
  }

  private void publish() {
    health = new LinkHealth(plan.port(), state, detail, since, tally.snapshot(), desk.channels());
  }

  private boolean isClosing() {
    return closing.getCount() == 0;
  }

  private void pause(long ms) {
    try {
      closing.await(ms, TimeUnit.MILLISECONDS);
    } catch (InterruptedException e) {
      closing.countDown();
    }
  }
}

package tunwarden.app.headless;

import java.io.IOException;
import java.time.Duration;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.alarm.AlarmKind;
import tunwarden.app.keeping.Keeping;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.journal.Harmless;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalReader;
import tunwarden.journal.Recorder;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.RealDisk;
import tunwarden.notice.Channel;
import tunwarden.notice.Notifier;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serve.EventFeed;
import tunwarden.serve.LatestState;
import tunwarden.serve.Served;
import tunwarden.serve.Server;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Sink;
import tunwarden.station.StationLoop;
import tunwarden.units.BadInputException;

/**
 * The whole of unattended watching, started and stopped in order: recorder, station, ports, server.
 * The cellar file can be read again while it runs; everything but ports and station stays up then.
 */
public final class Headless implements AutoCloseable {
  private static final Logger LOG = LoggerFactory.getLogger(Headless.class);
  private static final Duration STALLED = Duration.ofSeconds(5);

  private final HeadlessPlan plan;
  private final ByteLinkFactory links;
  private final InstantSource clock;
  private final Consumer<String> console;
  private final Disk disk = new RealDisk();
  private final LatestState latest = new LatestState();
  private final CountDownLatch closing = new CountDownLatch(1);
  private final Thread minder = new Thread(this::mind, "minder");

  private Recorder recorder;
  private Keeping keeping;
  private RequestDesk requests;
  private AlarmKeeper alarms;
  private Optional<Server> server = Optional.empty();
  private volatile Optional<Notifier> notifier = Optional.empty();
  private final ClockWatch clockWatch;
  private CellarWatch cellarWatch;
  private volatile Watching watching;
  private volatile boolean reloadAsked;
  private boolean closed;

  /**
   * Prepares; nothing is opened before {@link #start}.
   *
   * @param links opens serial ports
   * @param console told of what a person at the start should know, one sentence each
   */
  public Headless(
      HeadlessPlan plan, ByteLinkFactory links, InstantSource clock, Consumer<String> console) {
    this(plan, links, new Clocks(clock, System::nanoTime), console);
  }

  /** With other clocks than those of the computer. */
  Headless(HeadlessPlan plan, ByteLinkFactory links, Clocks clocks, Consumer<String> console) {
    this.plan = plan;
    this.links = links;
    this.clock = clocks.wall();
    this.clockWatch = new ClockWatch(clocks);
    this.console = console;
  }

  /**
   * Starts everything and returns.
   *
   * @throws BadInputException when cellar file, data folder or address cannot be used
   */
  public void start() throws IOException {
    Cellar cellar = CellarFile.read(plan.cellarFile());
    cellarWatch = new CellarWatch(plan.cellarFile());
    plan.serve().ifPresent(address -> Server.check(address, plan.token()));
    recorder = Recorder.open(plan.data(), disk, cellar.recording(), clock);
    try {
      begin(cellar);
    } catch (IOException | RuntimeException failed) {
      close();
      throw failed;
    }
  }

  private void begin(Cellar cellar) throws IOException {
    recorder.repairs().forEach(console);
    keeping = new Keeping(recorder, disk, clock, console);
    alarms = new AlarmKeeper(keeping.book(cellar), List.of(keeping));
    requests = new RequestDesk(recorder, disk, alarms, clock);
    EventFeed events = new EventFeed(Optional.of(reader()));
    recorder.listen(events);
    recorder.listen((entries, durable) -> notifier.ifPresent(n -> n.recorded(entries, durable)));
    recorder.watchDisk((failing, text) -> report(AlarmKind.DISK, failing, text));
    watching = new Watching(cellar, links, clock, sinks());
    notifier = notifier(cellar);
    if (notifier.isPresent()) {
      notifier.get().catchUp(reader());
    }
    keeping.resume(cellar, watching.station(), alarms);
    recorder.start();
    say("start", "Watching " + cellar.vessels().size() + " vessel(s) of " + cellar.file() + ".");
    sayWhatIsOff(cellar);
    if (plan.serve().isPresent()) {
      server = Optional.of(new Server(plan.serve().get(), plan.token(), served(events)));
      server.ifPresent(s -> console.accept("Serving on http:/" + s.address() + "/"));
    }
    watching.start();
    notifier.ifPresent(Notifier::start);
    minder.start();
  }

  private Optional<Notifier> notifier(Cellar cellar) throws IOException {
    List<Channel> channels = Channels.of(cellar, System.getenv());
    if (channels.isEmpty()) {
      return Optional.empty();
    }
    Notifier made =
        new Notifier(
            channels,
            disk,
            recorder.folder().notices(),
            clock,
            (failing, text) -> report(AlarmKind.NOTICE, failing, text),
            cellar.notice().rules());
    return Optional.of(made);
  }

  private List<Sink> sinks() {
    return List.of(alarms, recorder, latest, keeping);
  }

  private JournalReader reader() {
    return new JournalReader(disk, recorder.folder().journal());
  }

  private Served served(EventFeed events) {
    return new Served(latest, alarms::book, events, this::ailments, this::figures, clock);
  }

  private Served.RecorderFigures figures() {
    return new Served.RecorderFigures(
        recorder.accepted(), recorder.dropped(), recorder.waiting(), recorder.isFailing());
  }

  private void sayWhatIsOff(Cellar cellar) {
    cellar
        .alarms()
        .manner()
        .switchedOff()
        .forEach(
            (kind, why) ->
                say("start", "The alarm " + kind.id() + " is switched off: " + why + "."));
  }

  private void report(AlarmKind kind, boolean active, String text) {
    watching
        .loop()
        .submit(() -> alarms.change(book -> book.report(kind, active, text, clock.instant())));
  }

  private void say(String kind, String text) {
    console.accept(Harmless.text(text));
    recorder.write(JournalEntry.station(clock.instant(), kind, text));
  }

  /** Reasons why the program is not well. */
  List<String> ailments() {
    List<String> found = new ArrayList<>();
    Duration age = watching.loop().sinceHeartbeat();
    if (age.compareTo(STALLED) > 0) {
      found.add("The watching loop has not come round for " + age.toSeconds() + " s.");
    }
    if (watching.loop().dropped() > 0) {
      found.add(watching.loop().dropped() + " readings were lost before they could be looked at.");
    }
    if (recorder.isFailing()) {
      found.add("Recording has stopped; see the disk alarm.");
    }
    return found;
  }

  /** Asks for the cellar file to be read again; returns at once. */
  public void reload() {
    reloadAsked = true;
  }

  private void mind() {
    while (!awaitClosing()) {
      try {
        Optional<String> step = clockWatch.look();
        report(AlarmKind.CLOCK, step.isPresent(), step.orElse(""));
        watching.loop().submit(() -> alarms.change(book -> book.tick(clock.instant())));
        Watching present = watching;
        requests.serve(present.cellar(), present.station(), present.loop());
        if (reloadAsked || cellarWatch.hasChanged()) {
          reloadAsked = false;
          readAgain();
        }
      } catch (RuntimeException e) {
        LOG.error("minding goes on after a failure", e);
      }
    }
  }

  private boolean awaitClosing() {
    try {
      return closing.await(1, TimeUnit.SECONDS);
    } catch (InterruptedException e) {
      return true;
    }
  }

  private void readAgain() {
    try {
      Cellar cellar = CellarFile.read(plan.cellarFile());
      Watching next = new Watching(cellar, links, clock, sinks());
      Channels.of(cellar, System.getenv());
      change(next);
      report(AlarmKind.CONFIGURATION, false, "");
      sayWhatIsOff(cellar);
      say("reload", "The cellar file was read again: " + cellar.vessels().size() + " vessel(s).");
    } catch (BadInputException | IOException bad) {
      String text = "The cellar file was not taken: " + bad.getMessage();
      report(AlarmKind.CONFIGURATION, true, text);
      say("reload", text);
    }
  }

  /** Old ports and station end before the new begin; unchanged vessels keep what was learnt. */
  private void change(Watching next) throws IOException {
    Watching old = watching;
    if (!old.cellar().notice().equals(next.cellar().notice())) {
      notifier.ifPresent(Notifier::close);
      notifier = notifier(next.cellar());
      notifier.ifPresent(Notifier::start);
    }
    old.close();
    // Two loops at once would undo each other's alarms.
    while (!old.loop().hasEnded() && !awaitClosing()) {
      LOG.warn("waiting for the loop of the old cellar file to end");
    }
    keeping.goOver(old.cellar(), old.station(), next.cellar(), next.station());
    latest.retain(ids(next.cellar()));
    watching = next;
    next.start();
  }

  private static Set<String> ids(Cellar cellar) {
    Set<String> ids = new HashSet<>();
    cellar.vessels().forEach(vessel -> ids.add(vessel.id()));
    return ids;
  }

  /** The present loop. */
  StationLoop loop() {
    return watching.loop();
  }

  /** What is served and where, if it is. */
  Optional<Server> server() {
    return server;
  }

  /** Stops everything in order within two seconds; what was seen is recorded. */
  @Override
  public synchronized void close() {
    if (closed) {
      return;
    }
    closed = true;
    closing.countDown();
    if (watching != null) {
      watching.close();
      keeping.keep();
      recorder.write(JournalEntry.station(clock.instant(), "stop", "Watching ended."));
    }
    server.ifPresent(Server::close);
    try {
      recorder.close();
    } catch (IOException e) {
      LOG.warn("closing the recorder", e);
    }
    notifier.ifPresent(Notifier::close);
  }
}

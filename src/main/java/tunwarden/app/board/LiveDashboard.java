package tunwarden.app.board;

import java.io.IOException;
import java.nio.file.Path;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import tunwarden.alarm.AlarmKind;
import tunwarden.app.keeping.Keeping;
import tunwarden.app.keeping.Signals;
import tunwarden.config.Cellar;
import tunwarden.config.PortPlans;
import tunwarden.journal.Recorder;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Quantity;
import tunwarden.reading.Sample;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.Origin;
import tunwarden.screen.terminal.Dashboard;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.LinkHealth;
import tunwarden.serial.LinkWords;
import tunwarden.serial.PairGate;
import tunwarden.serial.PortPlan;
import tunwarden.serial.PortRunner;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Sink;
import tunwarden.station.StationLoop;

/** The dashboard over real instruments: ports, station, screen, started and stopped in order. */
public final class LiveDashboard {
  private final Cellar cellar;
  private final ByteLinkFactory links;
  private final InstantSource clock;
  private final List<PortRunner> ports = new ArrayList<>();
  private final Thread person = Thread.currentThread();
  private volatile boolean ending;

  private LiveDashboard(Cellar cellar, ByteLinkFactory links, InstantSource clock) {
    this.cellar = cellar;
    this.links = links;
    this.clock = clock;
  }

  /**
   * Watches until the person quits. Plans are made before anything is opened.
   *
   * @param data folder to record into; nothing is recorded without one
   * @throws IOException when the folder cannot be used
   */
  public static void run(
      Cellar cellar, Optional<Path> data, Front front, ByteLinkFactory links, InstantSource clock)
      throws IOException {
    LiveDashboard dashboard = new LiveDashboard(cellar, links, clock);
    List<PortPlan> plans = PortPlans.of(cellar);
    Signals.on("TERM", dashboard::end);
    Signals.on("INT", dashboard::end);
    if (data.isEmpty()) {
      dashboard.watch(plans, front, Optional.empty());
      return;
    }
    Disk disk = new RealDisk();
    try (Recorder recorder = Recorder.open(data.get(), disk, cellar.recording(), clock)) {
      List<String> said = new ArrayList<>();
      Keeping keeping = new Keeping(recorder, disk, clock, said::add);
      dashboard.watch(plans, front, Optional.of(new Record(recorder, keeping, said)));
    }
  }

  /**
   * Ends by way of the person's thread, before the virtual machine's own shutdown: the serial
   * library closes its ports in a shutdown hook, which would look like a pulled plug.
   */
  private void end() {
    ending = true;
    person.interrupt();
  }

  /** A port that is being closed has nothing to say about its instruments. */
  private void take(Sample sample, Consumer<Sample> inlet) {
    if (!ending) {
      inlet.accept(sample);
    }
  }

  /** What records, what keeps alarms and estimates for the next start, and what it says. */
  private record Record(Recorder recorder, Keeping keeping, List<String> said) {}

  private void watch(List<PortPlan> plans, Front front, Optional<Record> record) {
    BoardKeeper.Frame frame =
        new BoardKeeper.Frame(
            Origin.LIVE,
            front.zone(),
            cellar.alarms().stale(),
            clock::instant,
            Optional::empty,
            Optional::empty);
    Assembly assembly =
        Assembly.of(
            cellar.vessels(),
            cellar.alarms(),
            frame,
            this::source,
            record.map(r -> List.<Sink>of(r.recorder(), r.keeping())).orElse(List.of()),
            record.map(r -> List.<AlarmKeeper.Listener>of(r.keeping())).orElse(List.of()));
    record.ifPresent(
        r -> {
          assembly.alarms().restore(r.keeping().book(cellar));
          r.keeping().resume(cellar, assembly.station(), assembly.alarms());
          r.said().forEach(words -> assembly.board().write(note(words)));
        });
    try (StationLoop loop = new StationLoop(assembly.station(), clock)) {
      record.ifPresent(
          r -> {
            r.recorder().watchDisk((failing, text) -> disk(failing, text, loop, assembly));
            r.recorder().start();
          });
      Consumer<Sample> open = loop.inlet();
      Consumer<Sample> inlet = PairGate.over(plans, sample -> take(sample, open));
      plans.forEach(plan -> ports.add(new PortRunner(plan, links, inlet, clock)));
      LiveDesk.Hands hands =
          new LiveDesk.Hands(
              assembly.station(), loop, assembly.alarms(), assembly.board(), front.looks()::keep);
      Dashboard.run(
          assembly.board()::latest, new LiveDesk(hands, clock), front.options(() -> begin(loop)));
      // The interrupt has done its work; what follows must be waited for.
      Thread.interrupted();
    } finally {
      ending = true;
      ports.forEach(PortRunner::close);
    }
    record.ifPresent(r -> r.keeping().keep());
  }

  /** On the recorder's thread. */
  private void disk(boolean failing, String text, StationLoop loop, Assembly assembly) {
    loop.submit(
        () ->
            assembly
                .alarms()
                .change(book -> book.report(AlarmKind.DISK, failing, text, clock.instant())));
  }

  private JournalEntry note(String words) {
    return new JournalEntry(clock.instant(), "", "start", words);
  }

  private void begin(StationLoop loop) {
    loop.start();
    cellar.instruments().stream()
        .flatMap(instrument -> instrument.outOfService(clock.instant()).stream())
        .forEach(loop.inlet());
    ports.forEach(PortRunner::start);
  }

  private SignalSource source(String vessel, Quantity quantity) {
    for (PortRunner port : ports) {
      LinkHealth health = port.health();
      for (LinkHealth.Channel channel : health.channels()) {
        if (channel.binding().vessel().equals(vessel) && channel.binding().quantity() == quantity) {
          String device = channel.binding().profile().name();
          return new SignalSource(device, health.port(), () -> LinkWords.of(health, channel));
        }
      }
    }
    return SignalSource.BY_HAND;
  }
}

package tunwarden.app.headless;

import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import tunwarden.app.board.Assembly;
import tunwarden.config.Cellar;
import tunwarden.config.PortPlans;
import tunwarden.estimate.Estimators;
import tunwarden.reading.Sample;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.PairGate;
import tunwarden.serial.PortPlan;
import tunwarden.serial.PortRunner;
import tunwarden.station.Sink;
import tunwarden.station.Station;
import tunwarden.station.StationLoop;
import tunwarden.station.StationSettings;

/** The ports and the station of one reading of the cellar file; a changed file gets another. */
final class Watching implements AutoCloseable {
  private final Cellar cellar;
  private final Station station;
  private final StationLoop loop;
  private final InstantSource clock;
  private final List<PortRunner> ports = new ArrayList<>();
  private volatile boolean closing;

  /**
   * Prepares everything; nothing is opened yet.
   *
   * @throws tunwarden.units.BadInputException when an instrument's profile does not fit
   */
  Watching(Cellar cellar, ByteLinkFactory links, InstantSource clock, List<Sink> sinks) {
    this.cellar = cellar;
    this.clock = clock;
    StationSettings pacing = StationSettings.USUAL.withStale(cellar.alarms().stale());
    this.station =
        new Station(cellar.vessels(), Estimators.standard(), Assembly.FORECASTS, pacing, sinks);
    List<PortPlan> plans = PortPlans.of(cellar);
    this.loop = new StationLoop(station, clock);
    Consumer<Sample> open = loop.inlet();
    Consumer<Sample> inlet = PairGate.over(plans, sample -> take(sample, open));
    for (PortPlan plan : plans) {
      ports.add(new PortRunner(plan, links, inlet, clock));
    }
  }

  /** A port that is being closed has nothing to say about its instruments. */
  private void take(Sample sample, Consumer<Sample> inlet) {
    if (!closing) {
      inlet.accept(sample);
    }
  }

  Cellar cellar() {
    return cellar;
  }

  Station station() {
    return station;
  }

  StationLoop loop() {
    return loop;
  }

  void start() {
    loop.start();
    cellar.instruments().stream()
        .flatMap(instrument -> instrument.outOfService(clock.instant()).stream())
        .forEach(loop.inlet());
    ports.forEach(PortRunner::start);
  }

  /** Ports first, side by side, so that nothing more comes in; then the loop, which empties. */
  @Override
  public void close() {
    closing = true;
    List<Thread> closers = new ArrayList<>();
    for (PortRunner port : ports) {
      Thread closer = new Thread(port::close, "close port");
      closer.setDaemon(true);
      closer.start();
      closers.add(closer);
    }
    for (Thread closer : closers) {
      try {
        closer.join(1000);
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
      }
    }
    loop.close();
  }
}

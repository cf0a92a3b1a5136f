package tunwarden.app.board;

import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.config.Cellar;
import tunwarden.config.PortPlans;
import tunwarden.reading.Quantity;
import tunwarden.screen.model.Origin;
import tunwarden.screen.terminal.Dashboard;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.LinkHealth;
import tunwarden.serial.LinkWords;
import tunwarden.serial.PortPlan;
import tunwarden.serial.PortRunner;
import tunwarden.station.StationLoop;

/** The dashboard over real instruments: ports, station, screen, started and stopped in order. */
public final class LiveDashboard {
  private final Cellar cellar;
  private final InstantSource clock;
  private final List<PortRunner> ports = new ArrayList<>();

  private LiveDashboard(Cellar cellar, InstantSource clock) {
    this.cellar = cellar;
    this.clock = clock;
  }

  /** Watches until the person quits. Plans are made before anything is opened. */
  public static void run(Cellar cellar, Front front, ByteLinkFactory links, InstantSource clock) {
    new LiveDashboard(cellar, clock).watch(front, links);
  }

  private void watch(Front front, ByteLinkFactory links) {
    List<PortPlan> plans = PortPlans.of(cellar);
    BoardKeeper.Frame frame =
        new BoardKeeper.Frame(
            Origin.LIVE,
            front.zone(),
            cellar.alarms().stale(),
            clock::instant,
            Optional::empty,
            Optional::empty);
    Assembly assembly =
        Assembly.of(cellar.vessels(), cellar.alarms(), frame, this::source, List.of(), List.of());
    try (StationLoop loop = new StationLoop(assembly.station(), clock)) {
      plans.forEach(plan -> ports.add(new PortRunner(plan, links, loop.inlet(), clock)));
      loop.start();
      ports.forEach(PortRunner::start);
      LiveDesk.Hands hands =
          new LiveDesk.Hands(
              assembly.station(), loop, assembly.alarms(), assembly.board(), front.looks()::keep);
      Dashboard.run(assembly.board()::latest, new LiveDesk(hands, clock), front.options());
    } finally {
      ports.forEach(PortRunner::close);
    }
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

package tunwarden.report.find;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Fed every row of one vessel, it names the events once the log has ended. Memory is bounded. */
public final class EventFinder {
  private static final double LEAST_PA = 350;

  /** A slow movement this much larger than the quick ones in it is no mere sum of them. */
  private static final double MORE = 1.4;

  private static final long LASTING_MS = 200_000;

  private static final double SLOWEST_CHARGE_PA_PER_S = 40;

  /** Scatter below this share of the last digit cannot be trusted to move it. */
  private static final double LIVELY = 0.35;

  private final Vessel vessel;
  private final GapTracker gaps = new GapTracker();
  private final MovementTracker movements = MovementTracker.ofRows();
  private final SlowTracker tenSeconds = new SlowTracker(10_000, false, this::leastPa);
  private final SlowTracker minutes = new SlowTracker(60_000, true, this::leastPa);
  private final StillTracker still = new StillTracker();
  private final WarmingTracker warming = new WarmingTracker();
  private final Optional<OverTracker> over;

  /** A finder for one pass over one vessel's log. */
  public EventFinder(Vessel vessel) {
    this.vessel = vessel;
    this.over = vessel.limits().relief().map(r -> new OverTracker(r.setPaGauge()));
  }

  /** Takes in the next row. */
  public void add(Point point) {
    if (gaps.add(point)) {
      movements.silence();
      tenSeconds.silence();
      minutes.silence();
    }
    movements.add(point);
    tenSeconds.add(point);
    minutes.add(point);
    still.add(point);
    warming.add(point);
    over.ifPresent(tracker -> tracker.add(point));
  }

  /** The events, in order of time; call once, after the last row. */
  public List<Event> finish() {
    movements.silence();
    tenSeconds.silence();
    minutes.silence();
    still.finish();
    warming.finish();
    over.ifPresent(OverTracker::finish);
    List<Event> events = new ArrayList<>();
    Naming naming = new Naming(vessel, usualU95Pa());
    List<StillTracker.Stretch> frozen = frozen();
    Echoes.without(allMovements()).stream()
        .filter(m -> frozen.stream().noneMatch(s -> s.explains(m)))
        .filter(m -> !isGivenOff(m))
        .forEach(m -> events.add(naming.movement(m)));
    movements.spikes().forEach(m -> events.add(naming.spike(m)));
    gaps.gaps().forEach(g -> events.add(naming.gap(g)));
    frozen.forEach(s -> events.add(naming.frozen(s)));
    warming.rises().forEach(r -> events.add(naming.warming(r)));
    addOver(events, naming);
    events.sort(Comparator.comparing(Event::time).thenComparing(Event::kind));
    return events;
  }

  private double leastPa() {
    return Math.max(LEAST_PA, 2 * movements.noise().step());
  }

  /** The quick ones, and of the slower ones those that are not made up of quick ones. */
  private List<Movement> allMovements() {
    List<Movement> all = new ArrayList<>(movements.movements());
    for (SlowTracker slower : List.of(tenSeconds, minutes)) {
      for (Movement slow : slower.movements()) {
        List<Movement> parts = all.stream().filter(slow::meets).toList();
        double known = parts.stream().mapToDouble(Movement::changePa).sum();
        boolean lasting = slow.untilMs() - slow.fromMs() > LASTING_MS;
        double enough = lasting && parts.size() == 1 ? 1 / MORE : MORE;
        if (Math.abs(slow.changePa()) > enough * Math.abs(known)) {
          all.removeAll(parts);
          all.add(slow);
        }
      }
    }
    all.sort(Comparator.comparingLong(Movement::fromMs));
    return all;
  }

  /** A rise this slow is what a liquid gives off once it is shut in, not gas let in. */
  private static boolean isGivenOff(Movement movement) {
    double seconds = Math.max(1, (movement.untilMs() - movement.fromMs()) / 1000.0);
    return movement.changePa() > 0 && movement.changePa() / seconds < SLOWEST_CHARGE_PA_PER_S;
  }

  private double usualU95Pa() {
    return Math.max(vessel.accuracy().pressureU95Pa(), 2 * movements.noise().sigma());
  }

  /** Usual distance between rows, s; NaN while unknown. */
  public double usualIntervalS() {
    return gaps.usualS();
  }

  /** Scatter of the pressure about its course, Pa. */
  public double pressureNoisePa() {
    return movements.noise().sigma();
  }

  /** Smallest change that is told from noise, Pa. */
  public double tellingPa() {
    return movements.threshold();
  }

  /** Step of the pressure's last digit, Pa; 0 while unknown. */
  public double pressureStepPa() {
    return movements.noise().step();
  }

  /** Stretches much longer than the signal is ever still by itself, or still while it warmed. */
  private List<StillTracker.Stretch> frozen() {
    List<StillTracker.Stretch> longest = still.longest();
    List<StillTracker.Stretch> frozen = new ArrayList<>();
    boolean lively = movements.noise().sigma() >= LIVELY * movements.noise().step();
    boolean many = lively && longest.size() > 8;
    double usual = many ? longest.get(longest.size() / 2).seconds() : 0;
    double long3 = many ? longest.get(2).seconds() : 0;
    for (StillTracker.Stretch stretch : longest) {
      boolean unusual = many && stretch.seconds() > 6 * usual && stretch.seconds() > 2.2 * long3;
      if (stretch.seconds() >= 600 && (unusual || shouldHaveMoved(stretch))) {
        frozen.add(stretch);
      }
    }
    return frozen;
  }

  /** By the gas law alone, without the liquid's help, the change of temperature would show. */
  private boolean shouldHaveMoved(StillTracker.Stretch stretch) {
    double absolute = stretch.paGauge() + vessel.site().ambientPaAbsolute();
    double byGas = absolute * Math.abs(stretch.untilK() / stretch.fromK() - 1);
    double noticed = 3 * movements.noise().step() + 3 * movements.noise().sigma();
    return noticed > 0 && byGas > noticed;
  }

  private void addOver(List<Event> events, Naming naming) {
    if (over.isEmpty()) {
      return;
    }
    ReliefSetting relief = vessel.limits().relief().orElseThrow();
    for (Movement stretch : over.get().stretches()) {
      Instant from = Instant.ofEpochMilli(stretch.fromMs());
      Instant until = Instant.ofEpochMilli(stretch.untilMs()).plusSeconds(60);
      boolean lifted =
          events.stream()
              .anyMatch(
                  e ->
                      e.kind() == EventKind.LIFT
                          && !e.time().isBefore(from)
                          && !e.time().isAfter(until));
      if (!lifted) {
        events.add(naming.overRelief(stretch, relief));
      }
    }
  }
}

package tunwarden.report;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.rehearse.SimulatedVessel;
import tunwarden.rehearse.Valves;
import tunwarden.replay.LogRow;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/**
 * A harder day than {@link IncidentDay}: any size from a keg to 5 m³, rows every second to every
 * minute, a last digit of 1 to 20 mbar, vents quick, small and throttled, and one of five endings:
 * warming, cooling lost, a ferment that lifts the valve every few minutes, a valve that does not
 * open, a leak.
 */
final class RoughDay {
  private static final double BAR = 1e5;
  private static final int HOUR = 3600;
  private static final int END = 24 * HOUR;

  private record Plan(String kind, int at, int length, double size) {
    boolean on(int t) {
      return t >= at && t < at + length;
    }
  }

  private final Random random;
  private final double volumeM3;
  private final double fillM3;
  private final double reliefPa;
  private final boolean stated;
  private final double startK;
  private final int interval;
  private final double noisePa;
  private final double stepPa;
  private final SimulatedVessel vessel;
  private final List<Day.Truth> truth = new ArrayList<>();
  private final List<LogRow> rows = new ArrayList<>();
  private final List<Plan> plans = new ArrayList<>();
  private final Plan ending;
  private double markKg;
  private double shownBefore = Double.NaN;
  private double liftedAt = Double.NaN;
  private double lostAtLift;
  private double overAt = Double.NaN;

  RoughDay(long seed) {
    random = new Random(seed * 9_001_007 + 5);
    random.nextDouble();
    volumeM3 = 0.05 * Math.pow(100, random.nextDouble());
    fillM3 = volumeM3 * between(0.75, 0.95);
    reliefPa = between(1.3, 2.5) * BAR;
    startK = 273.15 + between(2, 14);
    interval = new int[] {1, 10, 30, 60}[random.nextInt(4)];
    noisePa = 20 * Math.pow(10, random.nextDouble());
    stepPa = new double[] {100, 200, 500, 1000, 2000}[random.nextInt(5)];
    vessel =
        new SimulatedVessel(
            new SimulatedVessel.Build(
                volumeM3,
                fillM3,
                Liquid.of(LiquidKind.BEER),
                101_325,
                Math.pow(10, between(-5.5, -4)),
                between(4, 12) * HOUR,
                between(40, 200)),
            startK);
    vessel.fill(between(0.5, 0.75) * reliefPa, 0, 1);
    ending = plan();
    if (noisePa < 0.4 * stepPa) {
      plans.removeIf(plan -> plan.kind().equals("frozen")); // such a gauge stands still by itself
    }
    stated = random.nextInt(4) > 0 || ending.kind().equals("over-relief");
    double opens = reliefPa - between(0, 0.09) * BAR;
    if (!ending.kind().equals("over-relief")) {
      double area = (volumeM3 - fillM3) / 1500;
      vessel.valves().relief(new Valves.Relief(opens, opens * between(0.86, 0.95), area));
    }
  }

  private double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  private Plan plan() {
    List<String> kinds =
        new ArrayList<>(
            List.of("vent", "small", "slow", "slow", "charge", "frozen", "gap", "spike"));
    Collections.shuffle(kinds, random);
    double t = between(0.8, 1.5) * HOUR;
    for (String kind : kinds.subList(0, 5)) {
      double length =
          switch (kind) {
            case "vent", "small" -> between(8, 60);
            case "slow" -> between(5, 20) * 60;
            case "charge" -> between(15, 120);
            case "frozen" -> between(25, 60) * 60;
            case "gap" -> between(12, 40) * 60;
            default -> 1;
          };
      double size = kind.equals("small") ? between(0.04, 0.1) : between(0.1, 0.4);
      plans.add(new Plan(kind, (int) t, (int) length, size));
      t += length + between(1, 2) * HOUR;
    }
    String[] endings = {"warming", "cooling-failure", "ferment", "over-relief", "leak"};
    return new Plan(endings[random.nextInt(5)], (int) t, END, between(14, 22));
  }

  Day run() {
    for (int t = 0; t < END; t++) {
      surround(t);
      boolean venting = act(t);
      double before = vessel.lostKg();
      boolean was = vessel.isLifting();
      vessel.advance(1);
      boolean leaking = ending.kind().equals("leak") && t >= ending.at();
      boolean blew = !venting && !leaking && vessel.lostKg() - before > 1e-9;
      watchLift(t, vessel.isLifting() || was || blew, before);
      watchOver(t);
      if (t % interval == 0) {
        row(t);
      }
    }
    if (warms()) {
      truth.add(new Day.Truth(warmingWord(), ending.at(), END, 0));
    } else if (ending.kind().equals("leak")) {
      truth.add(new Day.Truth("leak", ending.at(), END, 0));
    }
    truth.removeIf(each -> each.from() > END - 120);
    truth.sort(Comparator.comparingDouble(Day.Truth::from));
    String about =
        String.format(
            Locale.ROOT,
            "[%s %d s %.0f mbar %.2f m3 %s]",
            ending.kind(),
            interval,
            stepPa / 100,
            volumeM3,
            stated ? "stated" : "no relief");
    return new Day(rows, truth, described(), about);
  }

  private boolean warms() {
    return !ending.kind().equals("leak") && !ending.kind().equals("ferment");
  }

  private String warmingWord() {
    return ending.kind().equals("cooling-failure") ? "cooling-failure" : "warming";
  }

  private void surround(int t) {
    boolean warm = warms() && t >= ending.at();
    double base = 0.2 * Math.sin(2 * Math.PI * t / 2600.0);
    vessel.surroundings(startK + (warm ? ending.size() : base));
    if (ending.kind().equals("ferment") && t == ending.at()) {
      vessel.valves().making(between(3, 8) / 86_400);
    }
    if (ending.kind().equals("leak") && t == ending.at()) {
      vessel.valves().leak(between(0.02, 0.1) * (volumeM3 - fillM3) * 3.5 / HOUR);
    }
  }

  private boolean act(int t) {
    double room = volumeM3 - fillM3;
    double area = 0;
    for (Plan plan : plans) {
      switch (plan.kind()) {
        case "vent", "small", "slow" -> {
          // A bar or so is lost through room/200 in some seconds; throttled to what is planned.
          double seconds = Math.max(plan.length(), 1);
          area = plan.on(t) ? room * plan.size() / (200 * seconds) : area;
          markKg = t == plan.at() ? vessel.lostKg() : markKg;
          if (t == plan.at() + plan.length()) {
            truth.add(new Day.Truth("vent", plan.at(), t, vessel.lostKg() - markKg));
          }
        }
        case "charge" -> charge(t, plan);
        default -> {
          if (t == plan.at()) {
            double length = Math.max(plan.length(), interval);
            truth.add(new Day.Truth(plan.kind(), t, t + length, 0));
          }
        }
      }
    }
    vessel.valves().vent(area);
    return area > 0;
  }

  private void charge(int t, Plan plan) {
    if (t == plan.at()) {
      markKg = vessel.co2Kg();
      double most = 0.95 * reliefPa - 0.1 * BAR;
      vessel.valves().supply(Math.min(most, vessel.paGauge() + plan.size() * BAR));
    } else if (t == plan.at() + plan.length()) {
      vessel.valves().noSupply();
      truth.add(new Day.Truth("charge", plan.at(), t, markKg - vessel.co2Kg()));
    }
  }

  private void watchLift(int t, boolean blew, double lostBefore) {
    if (blew && Double.isNaN(liftedAt)) {
      liftedAt = t;
      lostAtLift = lostBefore;
    } else if (!blew && !Double.isNaN(liftedAt)) {
      truth.add(new Day.Truth(stated ? "lift" : "vent", liftedAt, t, vessel.lostKg() - lostAtLift));
      liftedAt = Double.NaN;
    }
  }

  private void watchOver(int t) {
    boolean over = vessel.paGauge() > reliefPa && ending.kind().equals("over-relief");
    if (over && Double.isNaN(overAt)) {
      overAt = t;
      truth.add(new Day.Truth("over-relief", t, END, 0));
    }
  }

  private void row(int t) {
    double shown = vessel.paGauge() + noisePa * random.nextGaussian();
    shown = Math.rint(shown / stepPa) * stepPa;
    for (Plan plan : plans) {
      boolean on = t >= plan.at() && t < plan.at() + Math.max(interval, plan.length());
      if (on && plan.kind().equals("gap")) {
        return;
      }
      shown = on && plan.kind().equals("frozen") && t > plan.at() ? shownBefore : shown;
      if (on && plan.kind().equals("spike")) {
        shown += (random.nextBoolean() ? 1 : -1) * Math.max(0.1, plan.size()) * BAR;
      }
    }
    shownBefore = shown;
    double kelvin = vessel.temperatureK() + 0.03 * random.nextGaussian();
    kelvin = 273.15 + Math.rint((kelvin - 273.15) * 10) / 10;
    Instant time = IncidentDay.START.plusSeconds(t);
    rows.add(
        new LogRow(
            0,
            time,
            "T",
            List.of(
                Reading.good(time, "T", Quantity.TEMPERATURE, kelvin),
                Reading.good(time, "T", Quantity.PRESSURE, shown))));
  }

  private Vessel described() {
    Vessel plain = Vessel.plain("T", volumeM3, fillM3, Liquid.of(LiquidKind.BEER));
    boolean cooled = ending.kind().equals("cooling-failure");
    return new Vessel(
        plain.id(),
        plain.title(),
        volumeM3,
        fillM3,
        plain.contents(),
        plain.closure(),
        new Limits(
            stated ? Optional.of(ReliefSetting.stated(reliefPa, 0.1 * BAR)) : Optional.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty()),
        plain.orifice(),
        plain.site(),
        cooled ? OptionalDouble.of(startK + ending.size()) : OptionalDouble.empty(),
        plain.accuracy(),
        plain.prospects());
  }
}

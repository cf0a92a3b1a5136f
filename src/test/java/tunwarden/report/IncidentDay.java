package tunwarden.report;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
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
 * A day in the life of a drawn vessel with a few incidents, and what truly happened. Instruments,
 * rates, row distance and sizes are drawn; the search never sees the truth.
 */
final class IncidentDay {
  private static final double BAR = 1e5;
  private static final double HOUR = 3600;
  static final Instant START = Instant.parse("2026-03-02T00:00:00Z");

  private final Random random;
  private final double volumeM3;
  private final double fillM3;
  private final double reliefPa;
  private final double startK;
  private final int interval;
  private final double noisePa;
  private final double stepPa;
  private final SimulatedVessel vessel;
  private final List<Day.Truth> truth = new ArrayList<>();
  private final List<LogRow> rows = new ArrayList<>();
  private final List<Plan> plans = new ArrayList<>();

  private record Plan(String kind, double at, double length, double size) {}

  IncidentDay(long seed) {
    random = new Random(seed * 7_368_787 + 11);
    random.nextDouble();
    volumeM3 = 0.2 * Math.pow(25, random.nextDouble());
    fillM3 = volumeM3 * between(0.8, 0.95);
    reliefPa = between(1.3, 2.5) * BAR;
    startK = 273.15 + between(2, 14);
    interval = new int[] {2, 5, 10, 30}[random.nextInt(4)];
    noisePa = 30 * Math.pow(10, random.nextDouble());
    stepPa = new double[] {10, 100, 100}[random.nextInt(3)];
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
    double opens = reliefPa - between(0, 0.09) * BAR;
    vessel
        .valves()
        .relief(new Valves.Relief(opens, opens * between(0.86, 0.95), (volumeM3 - fillM3) / 1500));
    plan();
  }

  private double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  private void plan() {
    List<String> kinds =
        new ArrayList<>(List.of("vent", "charge", "frozen", "gap", "spike", "vent"));
    java.util.Collections.shuffle(kinds, random);
    double t = between(0.8, 1.5) * HOUR;
    for (String kind : kinds.subList(0, 4)) {
      double length =
          switch (kind) {
            case "vent" -> between(8, 60);
            case "charge" -> between(15, 120);
            case "frozen" -> between(25, 60) * 60;
            case "gap" -> between(10, 40) * 60;
            default -> 1;
          };
      plans.add(new Plan(kind, Math.rint(t), Math.rint(length), between(0.08, 0.4)));
      t += length + between(1, 2) * HOUR;
    }
    plans.add(new Plan("warming", Math.rint(t), 0, between(14, 22)));
  }

  Day run() {
    double ventM2 = (volumeM3 - fillM3) / between(1500, 6000);
    double lifted = Double.NaN;
    double lostAtLift = 0;
    double frozenPa = Double.NaN;
    for (int t = 0; t < 24 * HOUR; t++) {
      double base = 0.2 * Math.sin(2 * Math.PI * t / 2600.0);
      Plan warm = plans.get(plans.size() - 1);
      vessel.surroundings(t < warm.at() ? startK + base : startK + warm.size());
      act(t, ventM2);
      double lost = vessel.lostKg();
      boolean was = vessel.isLifting();
      vessel.advance(1);
      boolean blew = vessel.isLifting() || was || liftedWithin(lost);
      if (blew && Double.isNaN(lifted)) {
        lifted = t;
        lostAtLift = lost;
      } else if (!blew && !Double.isNaN(lifted)) {
        truth.add(new Day.Truth("lift", lifted, t, vessel.lostKg() - lostAtLift));
        lifted = Double.NaN;
      }
      if (t % interval == 0) {
        frozenPa = row(t, frozenPa);
      }
    }
    Plan warm = plans.get(plans.size() - 1);
    truth.add(new Day.Truth("warming", warm.at(), 24 * HOUR, 0));
    truth.sort(Comparator.comparingDouble(Day.Truth::from));
    return new Day(rows, truth, described(), "[every " + interval + " s]");
  }

  private boolean venting;
  private double markKg;

  private boolean liftedWithin(double before) {
    return !venting && vessel.lostKg() - before > 1e-9;
  }

  private void act(int t, double ventM2) {
    venting = false;
    for (Plan plan : plans) {
      boolean on = t >= plan.at() && t < plan.at() + plan.length();
      if (plan.kind().equals("vent")) {
        venting |= on;
        markKg = t == plan.at() ? vessel.lostKg() : markKg;
        if (t == plan.at() + plan.length()) {
          truth.add(new Day.Truth("vent", plan.at(), t, vessel.lostKg() - markKg));
        }
      } else if (plan.kind().equals("charge")) {
        if (t == plan.at()) {
          markKg = vessel.co2Kg();
          vessel.valves().supply(vessel.paGauge() + plan.size() * BAR);
        } else if (t == plan.at() + plan.length()) {
          vessel.valves().noSupply();
          truth.add(new Day.Truth("charge", plan.at(), t, markKg - vessel.co2Kg()));
        }
      } else if (t == plan.at() && !plan.kind().equals("warming")) {
        truth.add(new Day.Truth(plan.kind(), plan.at(), plan.at() + plan.length(), 0));
      }
    }
    vessel.valves().vent(venting ? ventM2 : 0);
  }

  private double row(int t, double frozenPa) {
    double shown = vessel.paGauge() + noisePa * random.nextGaussian();
    shown = Math.rint(shown / stepPa) * stepPa;
    double next = Double.NaN;
    for (Plan plan : plans) {
      boolean on = t >= plan.at() && t < plan.at() + Math.max(interval, plan.length());
      if (on && plan.kind().equals("gap")) {
        return frozenPa;
      }
      if (on && plan.kind().equals("frozen")) {
        next = Double.isNaN(frozenPa) ? shown : frozenPa;
        shown = next;
      }
      if (on && plan.kind().equals("spike")) {
        shown += (random.nextBoolean() ? 1 : -1) * plan.size() * BAR;
      }
    }
    double kelvin =
        273.15
            + Math.rint((vessel.temperatureK() - 273.15 + 0.03 * random.nextGaussian()) * 100)
                / 100;
    Instant time = START.plusSeconds(t);
    rows.add(
        new LogRow(
            0,
            time,
            "T",
            List.of(
                Reading.good(time, "T", Quantity.TEMPERATURE, kelvin),
                Reading.good(time, "T", Quantity.PRESSURE, shown))));
    return next;
  }

  private Vessel described() {
    return Vessel.plain("T", volumeM3, fillM3, Liquid.of(LiquidKind.BEER))
        .withLimits(
            new Limits(
                Optional.of(ReliefSetting.stated(reliefPa, 0.1 * BAR)),
                OptionalDouble.empty(),
                OptionalDouble.empty()));
  }
}

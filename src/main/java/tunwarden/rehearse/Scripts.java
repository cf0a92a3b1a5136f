package tunwarden.rehearse;

import java.time.Duration;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.Constants;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Room;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/**
 * Invented tanks in an invented cellar, and what befalls them. Times in seconds, pressures gauge.
 */
final class Scripts {
  private static final double BAR = 1e5;
  private static final double HOUR = 3600;
  private static final double DAY = 24 * HOUR;
  private static final double ROOM_M3 = 180;
  private static final double AIR_CHANGES_PER_S = 2 / HOUR;
  private static final double WARM_C = 24;
  private static final double VENT_M2 = 2e-5;

  /** A bright tank on eight bar behind a regulator of 2 mm, wanted at 5.2 g/L. */
  private static final Prospects ON_SUPPLY =
      new Prospects(
          Optional.empty(),
          Optional.of(new Prospects.Target(5.2, OptionalDouble.empty())),
          Optional.of(
              new Prospects.Supply(
                  8 * BAR, Optional.of(new ReliefOrifice(0.002, 0.6)), OptionalDouble.empty())),
          OptionalDouble.empty(),
          OptionalDouble.empty());

  private Scripts() {}

  /**
   * A tank drawn from a few round figures.
   *
   * @param title drink, in the user's words
   * @param volumeM3 gross volume, m³
   * @param fillM3 liquid, m³
   * @param startC first temperature, °C
   * @param transferPerS kLa, 1/s
   * @param warmingH time constant against the surroundings, h
   */
  private record Tank(
      String id,
      String title,
      double volumeM3,
      double fillM3,
      double startC,
      double transferPerS,
      double warmingH) {

    SimulatedVessel simulated() {
      SimulatedVessel.Build build =
          new SimulatedVessel.Build(
              volumeM3,
              fillM3,
              Liquid.of(LiquidKind.BEER),
              Site.SEA_LEVEL.ambientPaAbsolute(),
              transferPerS,
              warmingH * HOUR,
              90);
      SimulatedVessel vessel = new SimulatedVessel(build, startC + Constants.ZERO_CELSIUS_K);
      // This very valve opens a little early, as its tolerance allows, and reseats 9 % lower.
      vessel.valves().relief(new Valves.Relief(1.46 * BAR, 1.33 * BAR, orifice().areaM2() * 0.6));
      return vessel;
    }

    private static ReliefOrifice orifice() {
      return new ReliefOrifice(0.015, 0.6);
    }

    Vessel described() {
      Site site =
          new Site(
              Site.SEA_LEVEL.ambientPaAbsolute(),
              Site.SEA_LEVEL.ambientU95Pa(),
              Optional.of(new Room(ROOM_M3, AIR_CHANGES_PER_S)));
      Limits limits =
          new Limits(
              Optional.of(ReliefSetting.stated(1.5 * BAR, 0.1 * BAR)),
              OptionalDouble.of(2 * BAR),
              OptionalDouble.of(-0.02 * BAR));
      return new Vessel(
          id,
          title,
          volumeM3,
          fillM3,
          new Vessel.Contents(Liquid.of(LiquidKind.BEER), GasMix.CO2, 0),
          Closure.INFER,
          limits,
          Optional.of(orifice()),
          site,
          OptionalDouble.of(WARM_C + Constants.ZERO_CELSIUS_K),
          Accuracy.usual(volumeM3),
          id.equals("BT1") ? ON_SUPPLY : Prospects.NONE);
    }
  }

  private static final Tank BRIGHT = new Tank("BT1", "bright lager", 1, 0.92, 3, 2e-5, 12);
  private static final Tank PALE = new Tank("FV2", "pale ale", 2, 1.8, 4, 6e-5, 9);
  private static final Tank AMBER = new Tank("FV1", "amber ale", 2, 1.7, 18, 4e-4, 30);

  private static Script.Sensors sensors(Random random) {
    return new Script.Sensors(
        new SimulatedSensor(random, 0.004 * random.nextGaussian(), 0.0006, 0.001),
        new SimulatedSensor(random, 0.1 * random.nextGaussian(), 0.02, 0.01));
  }

  private static Script script(
      Tank tank, SimulatedVessel vessel, Random random, double lengthS, Script.Course course) {
    return new Script(
        tank.described(),
        vessel,
        sensors(random),
        Duration.ofSeconds((long) lengthS),
        Duration.ofSeconds(lengthS > 1.5 * DAY ? 30 : 10),
        course);
  }

  private static double kelvin(double celsius) {
    return celsius + Constants.ZERO_CELSIUS_K;
  }

  static Script settled(Random random) {
    SimulatedVessel vessel = BRIGHT.simulated();
    vessel.fill(0.82 * BAR, 0, 1);
    return script(
        BRIGHT,
        vessel,
        random,
        DAY,
        (t, v, s) -> v.surroundings(kelvin(3 + 0.3 * Math.sin(2 * Math.PI * t / 2400))));
  }

  static Script coolingLost(Random random) {
    SimulatedVessel vessel = PALE.simulated();
    vessel.fill(0.85 * BAR, 0, 1);
    double lost = 1.5 * HOUR;
    return script(
            PALE,
            vessel,
            random,
            DAY,
            (t, v, s) ->
                v.surroundings(
                    t < lost ? kelvin(4 + 0.5 * Math.sin(2 * Math.PI * t / 1800)) : kelvin(WARM_C)))
        .remark(lost, "chiller tripped");
  }

  static Script sealedTooEarly(Random random) {
    SimulatedVessel vessel = AMBER.simulated();
    vessel.fill(0.02 * BAR, 0, 1.1);
    double shut = 20 * HOUR;
    return script(
            AMBER,
            vessel,
            random,
            2 * DAY,
            (t, v, s) -> {
              v.surroundings(kelvin(18));
              v.valves().spunding(t < shut ? 0.02 * BAR : Double.POSITIVE_INFINITY);
              v.valves().making(9 / DAY * Math.exp(-t / (1.2 * DAY)));
            })
        .remark(shut, "outlet closed");
  }

  static Script ventAndReturn(Random random) {
    SimulatedVessel vessel = PALE.simulated();
    vessel.fill(0.95 * BAR, 0, 1);
    double from = 2 * HOUR;
    return script(
            PALE,
            vessel,
            random,
            0.75 * DAY,
            (t, v, s) -> v.valves().vent(t >= from && t < from + 45 ? VENT_M2 * 4 : 0))
        .remark(from, "vented by hand");
  }

  static Script regulatorCreep(Random random) {
    SimulatedVessel vessel = BRIGHT.simulated();
    vessel.fill(0.8 * BAR, 0, 0.45);
    double creep = 10 * HOUR;
    return script(
        BRIGHT,
        vessel,
        random,
        DAY,
        (t, v, s) -> v.valves().supply(0.8 * BAR + 0.06 * BAR * Math.max(0, t - creep) / HOUR));
  }

  static Script slowLeak(Random random) {
    SimulatedVessel vessel = BRIGHT.simulated();
    vessel.fill(0.82 * BAR, 0, 1);
    double from = 4 * HOUR;
    return script(BRIGHT, vessel, random, DAY, (t, v, s) -> v.valves().leak(t < from ? 0 : 1.5e-5));
  }

  static Script frozenSensor(Random random) {
    SimulatedVessel vessel = PALE.simulated();
    vessel.fill(0.85 * BAR, 0, 1);
    double lost = 1.5 * HOUR;
    double frozen = 5 * HOUR;
    return script(
        PALE,
        vessel,
        random,
        0.75 * DAY,
        (t, v, s) -> {
          v.surroundings(kelvin(t < lost ? 4 : WARM_C));
          if (t == frozen) {
            s.pressure().freeze();
          }
        });
  }

  static Script unpurged(Random random) {
    SimulatedVessel vessel = PALE.simulated();
    vessel.fill(1.0 * BAR, 0.7 * BAR, 1);
    return script(
        PALE,
        vessel,
        random,
        2 * DAY,
        (t, v, s) -> v.surroundings(kelvin(6 + 5 * Math.sin(2 * Math.PI * t / DAY))));
  }

  static Script coldCrash(Random random) {
    Tank warm = new Tank("FV3", "stout", 2, 1.7, 19, 1e-4, 8);
    SimulatedVessel vessel = warm.simulated();
    vessel.fill(0.05 * BAR, 0, 1);
    double from = 2 * HOUR;
    return script(
            warm, vessel, random, DAY, (t, v, s) -> v.surroundings(kelvin(t < from ? 19 : 0.5)))
        .remark(from, "cooling set to 0.5 C");
  }
}

package tunwarden.simulate;

import tunwarden.vessel.Vessel;

/**
 * A drawn vessel at rest, read once, vented to a level and shut; what truly came of it.
 *
 * @param vessel as its user describes it
 * @param readPaGauge what the gauge showed before, Pa gauge
 * @param readK what the thermometer showed before, K
 * @param toPaGauge level vented to, Pa gauge
 * @param areaM2 effective area of the opening, m2
 * @param seconds how long it took, s
 * @param onceKg CO2 that left on the way down, kg
 * @param reboundPaGauge where the pressure came to rest afterwards, Pa gauge
 * @param heldKg CO2 that left the liquid in the other history, where the vent stayed open, kg
 */
public record VentTrial(
    Vessel vessel,
    double readPaGauge,
    double readK,
    double toPaGauge,
    double areaM2,
    double seconds,
    double onceKg,
    double reboundPaGauge,
    double heldKg) {
  private static final double FAST_TRANSFER = 1e-3;
  private static final double STEP_S = 0.02;

  /** The trial of a seed. */
  public static VentTrial run(long seed) {
    World shut = world(seed);
    double readPa = shut.instruments.pressure(shut.tank.pressurePaGauge(), shut.random);
    double readK = shut.instruments.temperature(shut.tank.temperatureK, shut.random);
    double down = shut.tank.pressurePaGauge() * shut.between(0.05, 0.7);
    double area = shut.ventArea();
    double seconds = vent(shut.tank, down, area);
    double once = shut.tank.passedKg;
    settle(shut.tank);

    World open = world(seed);
    vent(open.tank, down, area);
    double before = open.tank.dissolved();
    open.tank.spundingPaGauge = down;
    settle(open.tank);
    double held = (before - open.tank.dissolved()) * open.trueFillM3();
    return new VentTrial(
        shut.described(),
        readPa,
        readK,
        down,
        area,
        seconds,
        once,
        shut.tank.pressurePaGauge(),
        held);
  }

  private static World world(long seed) {
    World world = new World(seed, 0, 0);
    world.tank.fill(world.between(0.5, 2) * World.BAR, 0, 1);
    world.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    return world;
  }

  private static double vent(Tank tank, double down, double area) {
    tank.ventAreaM2 = area;
    tank.passedKg = 0;
    double seconds = 0;
    while (tank.pressurePaGauge() > down && seconds < World.HOUR) {
      tank.run(STEP_S);
      seconds += STEP_S;
    }
    tank.ventAreaM2 = 0;
    return seconds;
  }

  /** The state of rest does not depend on how fast the gas moves, so it may move fast. */
  private static void settle(Tank tank) {
    tank.transferPerS = FAST_TRANSFER;
    tank.run(3 * World.HOUR);
  }
}

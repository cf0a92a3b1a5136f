package tunwarden.simulate;

import java.util.ArrayList;
import java.util.List;

/** What is done to a tank over time, and how it is logged. */
abstract class Script {
  final World world;
  final Tank tank;
  double lengthS;
  double intervalS;
  double judgedFromS;
  double laboratoryAtS = Double.NaN;
  private final double ambientPa;
  private double liftedFrom;
  private double liftedUntil;
  private final List<Incident> incidents = new ArrayList<>();

  Script(World world) {
    this.world = world;
    this.tank = world.tank;
    this.ambientPa = tank.ambientPa;
    intervalS = new double[] {5, 10, 30, 60}[world.random.nextInt(4)];
  }

  /** Sets the valves for the time; called once a second or once a row, whichever is shorter. */
  abstract void act(double t);

  double temperature(double t) {
    return world.startK + 0.15 * Math.sin(t / 1700);
  }

  final void note(String kind, double from, double until, double gasKg) {
    incidents.add(new Incident(kind, from, until, gasKg));
  }

  final Simulation run() {
    List<Row> rows = new ArrayList<>();
    double u95 = 0.03 * tank.dissolved() + 0.05;
    for (double t = 0; t < lengthS; t += intervalS) {
      for (double s = 0; s < intervalS; s++) {
        tank.temperatureK = temperature(t + s);
        tank.ambientPa = ambientPa + world.instruments.weather(t + s);
        act(t + s);
        double before = tank.liftedKg;
        tank.run(Math.min(1, intervalS - s));
        watchRelief(t + s, before);
      }
      rows.add(row(t + intervalS, u95));
    }
    return new Simulation(world.described(), rows, incidents, judgedFromS, u95);
  }

  private void watchRelief(double t, double liftedBefore) {
    if (tank.liftedKg > liftedBefore) {
      liftedFrom = liftedBefore == 0 ? t : liftedFrom;
      liftedUntil = t + 1;
    } else if (tank.liftedKg > 0) {
      note("lift", liftedFrom, liftedUntil, tank.liftedKg);
      tank.liftedKg = 0;
    }
  }

  private Row row(double t, double u95) {
    boolean laboratory = laboratoryAtS > t - intervalS && laboratoryAtS <= t;
    double lab = laboratory ? tank.dissolved() + u95 / 2 * world.random.nextGaussian() : Double.NaN;
    boolean held = tank.supplyPaGauge > -1e9 || tank.spundingPaGauge > -1e9 || tank.ventAreaM2 > 0;
    return new Row(
        t,
        world.instruments.pressure(tank.pressurePaGauge(), world.random),
        world.instruments.temperature(tank.temperatureK, world.random),
        lab,
        new Row.Truth(tank.dissolved(), tank.equilibrium(), tank.airFraction(), held));
  }
}

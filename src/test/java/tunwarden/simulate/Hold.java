package tunwarden.simulate;

import static tunwarden.simulate.World.BAR;
import static tunwarden.simulate.World.DAY;
import static tunwarden.simulate.World.HOUR;

/** Vessels held from outside for days and shut at last, for judging the look back. */
public enum Hold {
  /** Flat drink on a gas supply, then shut for half a day. */
  SUPPLY,
  /** Settled, vented and left open for a day or three, then shut for half a day. */
  OPENED,
  /** The supply is turned to another level half-way. */
  STEPPED,
  /** On a supply while the temperature drifts by some degrees, day and night. */
  DRIFTING,
  /** On a supply, shut, on it again, shut again. */
  SEVERAL,
  /** On a supply; the log ends one to three hours after it was shut. */
  BRIEF,
  /** On a supply, read by a gauge with 1 to 10 mbar of scatter and a last digit of 10 mbar. */
  COARSE,
  /** A keg of 50 L filled to 97 %, on a supply. */
  KEG;

  /** The log drawn from a seed, a row every so many seconds. */
  public Simulation run(long seed, double intervalS) {
    long own = seed * 53 + ordinal();
    World w = this == KEG ? new World(own, 0.05, 0.97) : new World(own, 0, 0);
    if (this == COARSE) {
      w.instruments =
          new Instruments(
              w.instruments.gaugeBiasPa(),
              100 * Math.pow(10, w.random.nextDouble()),
              1000,
              w.instruments.thermometerBiasK(),
              w.instruments.thermometerNoiseK(),
              0.1,
              w.instruments.weatherPa(),
              w.instruments.weatherPhase());
    }
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script = this == OPENED ? opened(w) : supplied(w);
    script.intervalS = intervalS;
    return script.run();
  }

  private Script supplied(World w) {
    double level = w.between(0.5, 1.6) * BAR;
    double other = this == STEPPED ? w.between(0.5, 1.6) * BAR : level;
    double shut = w.between(1.5, 3) * DAY;
    double turned = shut * w.between(0.3, 0.7);
    double again = turned + w.between(4, 10) * HOUR;
    double swing = this == DRIFTING ? w.between(0.5, 2) : 0;
    double drift = this == DRIFTING ? w.between(-3, 3) : 0;
    w.tank.fill(level, 0, w.between(0, 0.5));
    Script script =
        new Script(w) {
          @Override
          void act(double t) {
            boolean off = t >= shut || Hold.this == SEVERAL && t >= turned && t < again;
            tank.supplyPaGauge = off ? Double.NaN : t < turned ? level : other;
            boolean lowered = !off && t >= turned && tank.pressurePaGauge() > other + 300;
            tank.ventAreaM2 = lowered ? world.ventArea() / 10 : 0;
          }

          @Override
          double temperature(double t) {
            double day = swing * Math.sin(2 * Math.PI * t / DAY) + drift * t / shut;
            return Math.max(super.temperature(t) + day, 272.5);
          }
        };
    script.lengthS = shut + (this == BRIEF ? w.between(1, 3) : 12) * HOUR;
    return script;
  }

  private static Script opened(World w) {
    double from = w.between(1, 6) * HOUR;
    double shut = from + w.between(0.8, 3) * DAY;
    double area = w.ventArea();
    w.tank.fill(w.between(0.5, 1.8) * BAR, 0, 1);
    Script script =
        new Script(w) {
          @Override
          void act(double t) {
            tank.ventAreaM2 = t >= from && t < shut ? area : 0;
          }
        };
    script.lengthS = shut + 14 * HOUR;
    return script;
  }
}

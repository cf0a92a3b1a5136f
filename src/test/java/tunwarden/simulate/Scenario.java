package tunwarden.simulate;

import static tunwarden.simulate.World.BAR;
import static tunwarden.simulate.World.DAY;
import static tunwarden.simulate.World.HOUR;

import tunwarden.vessel.Vessel;

/** The situations the estimator must master, each drawn afresh from a seed. */
public enum Scenario {
  /** Settled, then warmed or chilled, sealed. */
  SETTLED {
    @Override
    Script script(World w) {
      return sealedAndWarmed(w, w.between(0.4, 1.8) * BAR);
    }
  },
  /** Vented and closed again: the rebound. */
  VENTED {
    @Override
    Script script(World w) {
      return vented(w);
    }
  },
  /** Flat drink on a gas supply for days, then the supply valve is closed. */
  SUPPLY {
    @Override
    Script script(World w) {
      return supplied(w);
    }
  },
  /** Fermenting behind a back-pressure device, then sealed, lifting the relief valve many times. */
  FERMENTING {
    @Override
    Script script(World w) {
      return fermenting(w);
    }
  },
  /** A headspace never purged of air, warm by day and cool by night. */
  UNPURGED {
    @Override
    Script script(World w) {
      return unpurged(w);
    }
  },
  /** Vented and held near the atmosphere for a day, then sealed. */
  OPENED {
    @Override
    Script script(World w) {
      return opened(w);
    }
  },
  /** A 50 L keg at 97 % fill. */
  KEG {
    @Override
    Script script(World w) {
      return sealedAndWarmed(w, w.between(0.6, 1.6) * BAR);
    }

    @Override
    World world(long seed) {
      return new World(seed, 0.05, 0.97, false);
    }
  },
  /** A laboratory value entered half-way while the pressure is held. */
  LABORATORY {
    @Override
    Script script(World w) {
      Script script = supplied(w);
      script.laboratoryAtS = script.lengthS / 2;
      script.judgedFromS = script.laboratoryAtS;
      return script;
    }
  };

  /** Where a drink begins to freeze, roughly; the simulator knows no ice. */
  private static final double FREEZING_K = 272.5;

  abstract Script script(World world);

  World world(long seed) {
    return new World(seed, 0, 0, this == FERMENTING);
  }

  /** The vessel of a seed as its user describes it. */
  public Vessel vessel(long seed) {
    return world(seed * 31 + ordinal()).described();
  }

  /** The log of this situation drawn from a seed. */
  public Simulation run(long seed) {
    return script(world(seed * 31 + ordinal())).run();
  }

  /** The same, logged no more often than every so many seconds. */
  public Simulation run(long seed, double leastIntervalS) {
    Script script = script(world(seed * 31 + ordinal()));
    script.intervalS = Math.max(script.intervalS, leastIntervalS);
    return script.run();
  }

  private static Script sealedAndWarmed(World w, double paGauge) {
    double change = (w.random.nextBoolean() ? 1 : -1) * w.between(3, 14);
    double target = Math.max(w.startK + change, FREEZING_K);
    double from = w.between(0.5, 4) * HOUR;
    double pace = w.between(0.5, 6) * HOUR;
    w.tank.fill(paGauge, 0, 1);
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script =
        new Script(w) {
          @Override
          void act(double t) {}

          @Override
          double temperature(double t) {
            double gone = t < from ? 0 : 1 - Math.exp(-(t - from) / pace);
            return super.temperature(t) + (target - w.startK) * gone;
          }
        };
    script.lengthS = w.between(18, 36) * HOUR;
    return script;
  }

  private static Script vented(World w) {
    double from = w.between(0.5, 4) * HOUR;
    double start = w.between(0.6, 2) * BAR;
    double down = start * w.between(0, 0.6);
    double area = w.ventArea();
    w.tank.fill(start, 0, 1);
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script =
        new Script(w) {
          private boolean done;

          @Override
          void act(double t) {
            boolean open = t >= from && !done && tank.pressurePaGauge() > down + 200;
            if (open && tank.ventAreaM2 == 0) {
              tank.passedKg = 0;
            }
            done |= t >= from && !open;
            if (!open && tank.ventAreaM2 > 0) {
              note("vent", from, t, tank.passedKg);
            }
            tank.ventAreaM2 = open ? area : 0;
          }
        };
    script.lengthS = w.between(20, 40) * HOUR;
    return script;
  }

  private static Script supplied(World w) {
    double level = w.between(0.5, 1.6) * BAR;
    double shut = w.between(1.5, 3) * DAY;
    w.tank.fill(level, 0, w.between(0, 0.5));
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script =
        new Script(w) {
          @Override
          void act(double t) {
            tank.supplyPaGauge = t < shut ? level : Double.NaN;
          }
        };
    script.lengthS = shut + 12 * HOUR;
    script.judgedFromS = shut + 2 * HOUR;
    return script;
  }

  private static Script fermenting(World w) {
    double level = w.between(0.3, 0.8) * BAR;
    double seal = w.between(0.4, 1) * DAY;
    double rate = w.between(0.5, 4) / DAY;
    double strength = w.between(0, 0.3);
    w.tank.transferPerS = Math.pow(10, w.between(-4.6, -3.3));
    double surplus = rate / w.tank.transferPerS;
    w.tank.fill(level, 0, 1);
    w.tank.fill(level, 0, 1 + Math.min(surplus / w.tank.equilibrium(), 0.5));
    Script script =
        new Script(w) {
          @Override
          void act(double t) {
            tank.spundingPaGauge = t < seal ? level : Double.NaN;
            tank.madeKgPerM3PerS = rate * Math.exp(-strength * t / DAY);
          }
        };
    script.lengthS = seal + w.between(1.5, 3) * DAY;
    script.judgedFromS = seal;
    return script;
  }

  private static Script unpurged(World w) {
    double phase = w.between(0, 6.28);
    double room = (w.startK - FREEZING_K) / (1 + Math.sin(phase));
    double swing = Math.min(w.between(2, 6), room);
    double air = w.between(0.3, 1) * BAR;
    w.tank.transferPerS = Math.pow(10, w.between(-5.5, -3.5));
    w.tank.fill(air - 0.6 * BAR + w.between(0.8, 1.8) * BAR, air, 1);
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script =
        new Script(w) {
          @Override
          void act(double t) {}

          @Override
          double temperature(double t) {
            return w.startK + swing * (Math.sin(phase + t * 2 * Math.PI / DAY) - Math.sin(phase));
          }
        };
    script.lengthS = w.between(2.5, 4) * DAY;
    return script;
  }

  private static Script opened(World w) {
    double from = w.between(1, 6) * HOUR;
    double shut = from + w.between(0.8, 1.2) * DAY;
    double area = w.ventArea();
    w.tank.fill(w.between(0.5, 1.8) * BAR, 0, 1);
    w.tank.reliefOpensPaGauge = Double.POSITIVE_INFINITY;
    Script script =
        new Script(w) {
          private boolean told;

          @Override
          void act(double t) {
            if (t >= from && tank.ventAreaM2 == 0 && !told) {
              tank.passedKg = 0;
            }
            tank.ventAreaM2 = t >= from && t < shut ? area : 0;
            if (tank.ventAreaM2 > 0 && !told && tank.pressurePaGauge() < 1500) {
              note("vent", from, t, tank.passedKg);
              told = true;
            }
          }
        };
    script.lengthS = shut + 14 * HOUR;
    script.judgedFromS = shut + 2 * HOUR;
    return script;
  }
}

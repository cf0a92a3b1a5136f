package tunwarden.forecast.room;

import tunwarden.vessel.Room;

/**
 * CO2 in a room that is mixed well, by mole fraction. Real rooms are not: cold CO2 lies low, so
 * near the floor and in pits there is more, and near the door less.
 */
public final class RoomAir {
  /** Outdoor air, mole fraction. */
  public static final double BACKGROUND = 420e-6;

  /** Oxygen in dry air, mole fraction (ISO 2533). */
  public static final double OXYGEN = 0.209476;

  /** CO2 at 20 °C and 1 atm, kg/m³ (computed, Span and Wagner 1996). */
  private static final double CO2_20C_KG_PER_M3 = 1.8393;

  private static final double PPM = 1e6;

  private RoomAir() {}

  /** Volume that a mass of CO2 takes up at 20 °C and 1 atm, m³. */
  public static double volumeM3(double co2Kg) {
    return co2Kg / CO2_20C_KG_PER_M3;
  }

  /** Mole fraction after a sudden release into still air, background included. */
  public static double afterRelease(double gasM3, Room room) {
    return BACKGROUND + gasM3 / room.volumeM3();
  }

  /**
   * C(t) = Ci + (C0 − Ci) e^(−nt) + q/(nV) (1 − e^(−nt)): the well-mixed dilution equation.
   *
   * @param start mole fraction now
   * @param supply mole fraction of the air that ventilation brings
   * @param inflowM3PerS CO2 let in, m³/s
   * @param room volume and ventilation
   * @param seconds how long, s
   */
  public static double after(
      double start, double supply, double inflowM3PerS, Room room, double seconds) {
    double changes = room.airChangesPerS() * seconds;
    double gained = inflowM3PerS * seconds / room.volumeM3();
    double washed = changes == 0 ? 1 : -Math.expm1(-changes) / changes;
    return supply + (start - supply) * Math.exp(-changes) + gained * washed;
  }

  /**
   * Highest mole fraction when a puff comes at once and the rest follows slower and slower, the way
   * a liquid at rest gives off its gas, background included.
   *
   * @param onceM3 gas let go at once, m³
   * @param followingM3 gas that follows in all, m³
   * @param releasePerS rate constant of what follows, 1/s
   * @param room volume and ventilation
   */
  public static double peak(double onceM3, double followingM3, double releasePerS, Room room) {
    double once = onceM3 / room.volumeM3();
    double following = followingM3 / room.volumeM3();
    double changes = room.airChangesPerS();
    if (!(changes > 0)) {
      return BACKGROUND + once + following;
    }
    if (following * releasePerS <= once * changes) {
      return BACKGROUND + once;
    }
    double time = peakTimeS(once, following, releasePerS, changes);
    return BACKGROUND + excess(once, following, releasePerS, changes, time);
  }

  /** Where d/dt of {@link #excess} is zero. */
  private static double peakTimeS(double once, double following, double release, double changes) {
    double difference = changes - release;
    if (Math.abs(difference) < 1e-6 * changes) {
      return 1 / changes - once / (following * release);
    }
    double fed = following * release / difference;
    return Math.log(changes * (fed - once) / (fed * release)) / difference;
  }

  /** Solution of dc/dt = following·release·e^(−release·t) − changes·c with c(0) = once. */
  private static double excess(
      double once, double following, double release, double changes, double time) {
    double difference = changes - release;
    double washed = once * Math.exp(-changes * time);
    if (Math.abs(difference) < 1e-6 * changes) {
      return washed + following * release * time * Math.exp(-changes * time);
    }
    double fed = following * release / difference;
    return washed + fed * (Math.exp(-release * time) - Math.exp(-changes * time));
  }

  /** Oxygen left when other gas has taken that share of the room, mole fraction. */
  public static double oxygenLeft(double gasM3, Room room) {
    return OXYGEN * Math.max(0, 1 - gasM3 / room.volumeM3());
  }

  /** Mole fraction as parts per million. */
  public static double ppm(double moleFraction) {
    return moleFraction * PPM;
  }
}

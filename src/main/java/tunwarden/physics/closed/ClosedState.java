package tunwarden.physics.closed;

import tunwarden.physics.gas.Gas;

/** A closed vessel at equilibrium; immutable. */
public final class ClosedState {
  private static final double MICROGRAM_PER_LITRE = 1e6;

  private final double totalPaAbsolute;
  private final double vapourPa;
  private final double headspaceM3;
  private final double liquidM3;
  private final boolean liquidFull;
  private final double[] partialPa;
  private final double[] dissolved;

  ClosedState(ClosedSolver solver) {
    totalPaAbsolute = solver.totalPaAbsolute();
    vapourPa = solver.vapourPa();
    headspaceM3 = solver.headspaceM3();
    liquidM3 = solver.liquidM3();
    liquidFull = solver.liquidFull();
    partialPa = new double[Gas.all().size()];
    dissolved = new double[Gas.all().size()];
    for (Gas gas : Gas.all()) {
      partialPa[gas.ordinal()] = solver.partialPa(gas);
      dissolved[gas.ordinal()] = solver.dissolvedKgPerM3(gas);
    }
  }

  /**
   * Total pressure, Pa absolute. Where the vessel is full of liquid this is what a rigid vessel
   * would see: the gas pressure plus the squeeze on the liquid; a real shell gives way and shows
   * less.
   */
  public double totalPaAbsolute() {
    return totalPaAbsolute;
  }

  /** Pressure of gas and vapour alone, Pa absolute: the total without any squeeze of the liquid. */
  public double gasPaAbsolute() {
    double sum = vapourPa;
    for (double each : partialPa) {
      sum += each;
    }
    return sum;
  }

  /** Partial pressure of one gas, Pa. */
  public double partialPa(Gas gas) {
    return partialPa[gas.ordinal()];
  }

  /** Water vapour, Pa. */
  public double vapourPa() {
    return vapourPa;
  }

  /** Dissolved gas, kg per m³ of liquid. */
  public double dissolvedKgPerM3(Gas gas) {
    return dissolved[gas.ordinal()];
  }

  /** Dissolved CO2, kg per m³ of liquid, which is g/L. */
  public double dissolvedCo2KgPerM3() {
    return dissolvedKgPerM3(Gas.CO2);
  }

  /** Dissolved oxygen, µg/L. */
  public double dissolvedOxygenMicrogramPerL() {
    return dissolvedKgPerM3(Gas.O2) * MICROGRAM_PER_LITRE;
  }

  /** Room left for gas, m³; zero when full of liquid. */
  public double headspaceM3() {
    return headspaceM3;
  }

  /** Volume the liquid wants at this temperature, m³; may exceed the vessel. */
  public double liquidM3() {
    return liquidM3;
  }

  /** True when the liquid has taken the whole vessel. */
  public boolean liquidFull() {
    return liquidFull;
  }
}

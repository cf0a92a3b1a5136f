package tunwarden.physics.closed;

import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.HeadspaceShares;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.LiquidSolubility;

/**
 * A rigid vessel of known volume holding liquid and gas, at equilibrium. Moles of every gas are
 * conserved between liquid and headspace; the liquid expands with temperature and the headspace
 * shrinks, to nothing if overfilled.
 *
 * <p>Left out, and small beside the solubility relation: stretch and expansion of the shell, the
 * compression of the liquid while there is a headspace (0.005 %/bar), its swelling by the gas
 * dissolved or lost after filling, and hydrostatic head. Immutable and thread-safe.
 */
public final class ClosedVessel {
  private final double volumeM3;
  private final double fillM3;
  private final double fillDensity;
  private final LiquidDensity density;
  private final LiquidSolubility solubility;

  /**
   * A vessel as filled.
   *
   * @param volumeM3 gross volume, m³
   * @param fillM3 liquid volume, m³, at the filling temperature
   * @param fillTemperatureK temperature at which the fill was read, K
   * @param liquid the drink
   */
  public ClosedVessel(double volumeM3, double fillM3, double fillTemperatureK, Liquid liquid) {
    if (!(volumeM3 > 0) || !(fillM3 >= 0) || !(fillM3 <= volumeM3)) {
      throw new IllegalArgumentException(
          "a fill of " + fillM3 + " m3 does not fit a vessel of " + volumeM3 + " m3");
    }
    this.volumeM3 = volumeM3;
    this.fillM3 = fillM3;
    this.density = LiquidDensity.of(liquid);
    this.fillDensity = density.kgPerM3(fillTemperatureK);
    this.solubility = LiquidSolubility.of(liquid);
  }

  private ClosedVessel(ClosedVessel other, LiquidSolubility solubility) {
    this.volumeM3 = other.volumeM3;
    this.fillM3 = other.fillM3;
    this.density = other.density;
    this.fillDensity = other.fillDensity;
    this.solubility = solubility;
  }

  /** The same vessel with another solubility, to try what an error of the relation would do. */
  public ClosedVessel withSolubility(LiquidSolubility other) {
    return new ClosedVessel(this, other);
  }

  /** Gross volume, m³. */
  public double volumeM3() {
    return volumeM3;
  }

  /** The liquid's solubility relations. */
  public LiquidSolubility solubility() {
    return solubility;
  }

  /** Volume of the liquid at a temperature, m³; may exceed the vessel. */
  public double liquidM3(double temperatureK) {
    return fillM3 * fillDensity / density.kgPerM3(temperatureK);
  }

  /** Room for gas at a temperature, m³; zero when the liquid takes the whole vessel. */
  public double headspaceM3(double temperatureK) {
    return Math.max(0, volumeM3 - liquidM3(temperatureK));
  }

  /** A workspace for solving often without allocating. */
  public ClosedSolver solver() {
    return new ClosedSolver(this);
  }

  /** The state the vessel comes to with this much gas at this temperature, K. */
  public ClosedState settle(Inventory inventory, double temperatureK) {
    ClosedSolver solver = solver();
    solver.settle(inventory.toArray(), temperatureK);
    return new ClosedState(solver);
  }

  /**
   * The gas held at equilibrium under a pressure: water vapour, left-over air, and the rest purge
   * gas.
   *
   * @param totalPaAbsolute total pressure, Pa absolute
   * @param temperatureK temperature, K
   * @param gas what the headspace was purged with
   * @param airPaAbsolute partial pressure of left-over air, Pa
   */
  public Inventory inventoryAt(
      double totalPaAbsolute, double temperatureK, GasMix gas, double airPaAbsolute) {
    double[] partial = new double[Gas.all().size()];
    partials(totalPaAbsolute, temperatureK, gas, airPaAbsolute, partial);
    double[] mol = new double[partial.length];
    solver().inventoryAt(partial, totalPaAbsolute, temperatureK, mol);
    return Inventory.of(mol);
  }

  /** Partial pressures, Pa, of the dry gases in a headspace as {@link #inventoryAt} splits it. */
  public void partials(
      double totalPaAbsolute, double temperatureK, GasMix gas, double airPaAbsolute, double[] out) {
    double dry = totalPaAbsolute - solubility.vapourPressurePa(temperatureK);
    for (int i = 0; i < out.length; i++) {
      out[i] = HeadspaceShares.partialPa(Gas.all().get(i), gas, dry, airPaAbsolute);
    }
  }
}

package tunwarden.rehearse;

import java.util.Arrays;
import tunwarden.physics.closed.HeadspaceGas;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.GasLine;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.Constants;

/**
 * A vessel that behaves by the physics, integrated in short steps: headspace and liquid exchange
 * CO2 at first order, gas leaves through a vent, a relief valve, a back-pressure device or a leak,
 * comes in from a supply, and is made by fermentation. Mutable; one thread.
 */
public final class SimulatedVessel {
  private static final double QUIET_STEP_S = 1;
  private static final double BLOWING_STEP_S = 0.05;

  /**
   * Gas cools while it expands: ideal gas, reversible, k of CO2 (see {@link IsentropicOrifice}).
   */
  private static final double EXPANSION = 0.3;

  private static final double REGULATOR_SHARE_PER_PA_S = 1e-6;

  private final Build build;
  private final LiquidDensity density;
  private final double fillDensity;
  private final GasLine line;
  private final HeadspaceGas headspace = new HeadspaceGas();
  private final double[] mol = new double[Gas.all().size()];
  private final double[] partial = new double[Gas.all().size()];
  private final Valves valves = new Valves();

  private double temperatureK;
  private double surroundingsK;
  private double chillK;
  private double dissolvedKgPerM3;
  private double totalPa;
  private double equilibrium;
  private boolean lifting;
  private double lostKg;

  /**
   * What stays the same.
   *
   * @param volumeM3 gross volume, m³
   * @param fillM3 liquid at the first temperature, m³
   * @param liquid the drink
   * @param ambientPa atmosphere, Pa absolute
   * @param transferPerS kLa, 1/s
   * @param warmingS time constant of the contents against their surroundings, s
   * @param gasWarmingS time constant of the headspace gas against its walls, s
   */
  public record Build(
      double volumeM3,
      double fillM3,
      Liquid liquid,
      double ambientPa,
      double transferPerS,
      double warmingS,
      double gasWarmingS) {}

  /**
   * A vessel at rest.
   *
   * @param build what stays the same
   * @param temperatureK temperature of everything, K
   */
  public SimulatedVessel(Build build, double temperatureK) {
    this.build = build;
    this.temperatureK = temperatureK;
    this.surroundingsK = temperatureK;
    this.density = LiquidDensity.of(build.liquid());
    this.line = LiquidSolubility.of(build.liquid()).line(Gas.CO2);
    this.fillDensity = density.kgPerM3(temperatureK);
    fill(0, 0, 1);
  }

  /**
   * Sets the contents.
   *
   * @param paGauge headspace pressure, Pa gauge
   * @param airPa air in the headspace, partial pressure, Pa
   * @param shareOfEquilibrium dissolved CO2 over what the headspace would keep in it
   */
  public void fill(double paGauge, double airPa, double shareOfEquilibrium) {
    Arrays.fill(partial, 0);
    line.prepareAt(temperatureK);
    for (Gas gas : Gas.all()) {
      partial[gas.ordinal()] = airPa * GasMix.AIR.fraction(gas);
    }
    partial[Gas.CO2.ordinal()] = paGauge + build.ambientPa() - airPa - line.vapourPa();
    headspace.mol(partial, headspaceM3(), temperatureK, mol);
    dissolvedKgPerM3 = 0;
    look();
    dissolvedKgPerM3 = shareOfEquilibrium * equilibrium;
  }

  /** What a person, or a fault, does to the vessel. */
  public Valves valves() {
    return valves;
  }

  /** Sets what the contents warm or cool towards, K. */
  public void surroundings(double kelvin) {
    surroundingsK = kelvin;
  }

  /** Lets time pass, in steps that suit what is going on. */
  public void advance(double seconds) {
    double left = seconds;
    while (left > 1e-9) {
      valves.relief().ifPresent(r -> lifting = r.isOpen(paGauge(), lifting));
      double step = Math.min(left, isBlowing() || isFilling() ? BLOWING_STEP_S : QUIET_STEP_S);
      step(step);
      left -= step;
    }
  }

  private boolean isBlowing() {
    return lifting || valves.ventAreaM2() > 0 && Math.abs(paGauge()) > 50;
  }

  private boolean isFilling() {
    return valves.supplyPaGauge() - paGauge() > 1000;
  }

  private void step(double dt) {
    temperatureK += (surroundingsK - temperatureK) * -Math.expm1(-dt / build.warmingS());
    chillK *= Math.exp(-dt / build.gasWarmingS());
    double liquidM3 = build.fillM3();
    double released = build.transferPerS() * (dissolvedKgPerM3 - equilibrium) * dt;
    dissolvedKgPerM3 += valves.madeKgPerM3PerS() * dt - released;
    mol[Gas.CO2.ordinal()] += released * liquidM3 / Gas.CO2.molarMass();
    move(outwardKgPerS() * dt);
    look();
  }

  /** Net flow out of the headspace, kg/s; negative when gas comes in. */
  private double outwardKgPerS() {
    double gauge = paGauge();
    double out = valves.leakKgPerS() * Math.max(0, gauge) / 1e5;
    out += orifice(valves.ventAreaM2(), gauge);
    if (lifting) {
      out += orifice(valves.relief().orElseThrow().areaM2(), gauge);
    }
    double perPa = headspaceKg() * REGULATOR_SHARE_PER_PA_S;
    out += Math.max(0, gauge - valves.spundingPaGauge()) * perPa;
    out -= Math.max(0, valves.supplyPaGauge() - gauge) * perPa;
    return out;
  }

  private double orifice(double areaM2, double gauge) {
    if (areaM2 == 0) {
      return 0;
    }
    double ambient = build.ambientPa();
    double zrt =
        RealGas.z(Gas.CO2, totalPa, gasK()) * Constants.GAS_CONSTANT * gasK() / Gas.CO2.molarMass();
    double k = IsentropicOrifice.k(GasMix.CO2);
    return gauge >= 0
        ? areaM2 * IsentropicOrifice.flux(k, zrt, totalPa, ambient)
        : -areaM2 * IsentropicOrifice.flux(k, zrt, ambient, totalPa);
  }

  /** Takes gas out in proportion to what is there, or lets CO2 (through a vent, air) in. */
  private void move(double kg) {
    if (kg == 0) {
      return;
    }
    double share = Math.min(0.2, Math.abs(kg) / headspaceKg());
    if (kg > 0) {
      chillK += EXPANSION * (temperatureK - chillK) * share;
      for (int i = 0; i < mol.length; i++) {
        mol[i] *= 1 - share;
      }
      lostKg += share * headspaceKg() / (1 - share);
    } else if (valves.ventAreaM2() > 0) {
      double moles = totalMol() * share;
      for (Gas gas : Gas.all()) {
        mol[gas.ordinal()] += moles * GasMix.AIR.fraction(gas);
      }
    } else {
      mol[Gas.CO2.ordinal()] += -kg / Gas.CO2.molarMass();
    }
  }

  /** Works out pressure and equilibrium from what is in the vessel. */
  private void look() {
    totalPa = headspace.totalPa(mol, headspaceM3(), gasK(), partial);
    line.prepareAt(temperatureK);
    equilibrium = line.dissolvedKgPerM3(partial[Gas.CO2.ordinal()], totalPa);
  }

  private double headspaceM3() {
    double liquid = build.fillM3() * fillDensity / density.kgPerM3(temperatureK);
    return Math.max(1e-6 * build.volumeM3(), build.volumeM3() - liquid);
  }

  private double gasK() {
    return temperatureK - chillK;
  }

  private double totalMol() {
    return Arrays.stream(mol).sum();
  }

  private double headspaceKg() {
    double kg = 0;
    for (Gas gas : Gas.all()) {
      kg += mol[gas.ordinal()] * gas.molarMass();
    }
    return kg;
  }

  /** Headspace pressure, Pa gauge. */
  public double paGauge() {
    return totalPa - build.ambientPa();
  }

  /** Temperature of the liquid, K. */
  public double temperatureK() {
    return temperatureK;
  }

  /** Dissolved CO2, kg/m³. */
  public double dissolvedKgPerM3() {
    return dissolvedKgPerM3;
  }

  /** What the liquid would hold at rest with this headspace, kg/m³. */
  public double equilibriumKgPerM3() {
    return equilibrium;
  }

  /** Whether the relief valve is open. */
  public boolean isLifting() {
    return lifting;
  }

  /** All CO2 in the vessel, kg; what is conserved while it is shut. */
  public double co2Kg() {
    return dissolvedKgPerM3 * build.fillM3() + mol[Gas.CO2.ordinal()] * Gas.CO2.molarMass();
  }

  /** Gas that has left since the start, kg. */
  public double lostKg() {
    return lostKg;
  }
}

package tunwarden.forecast;

import tunwarden.forecast.vacuum.Vacuum;
import tunwarden.physics.closed.ClosedSolver;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.gas.DryBlend;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.solubility.GasLine;

/**
 * One vessel with a definite value for everything that is uncertain: moles of each gas in headspace
 * and liquid, which need not be at rest with each other. Forecasts ask one world, or an {@link
 * Ensemble} of them for their spread. Its content never changes, but it works in a scratch space of
 * its own: one thread at a time.
 */
public final class World {
  private static final double TILT_SPAN_K = 20;
  private static final double ADIABATIC = 0.3;
  private static final int MOST_STEPS = 40;
  private static final int FLUSH_STEPS = 5;
  private static final double CLOSE_PA = 0.01;
  private static final int CO2 = Gas.CO2.ordinal();
  private static final int GASES = Gas.all().size();

  private final Setting setting;
  private final ClosedVessel vessel;
  private final ClosedSolver solver;
  private final GasLine co2;
  private final double[] partialPa;
  private final double[] headMol;
  private final double[] liquidMol;

  /**
   * What no forecast changes.
   *
   * @param present where it starts
   * @param fillM3 liquid as filled, m³
   * @param temperatureK of the vessel now, K
   * @param ambientPa atmosphere, Pa absolute
   * @param relation true solubility over the relation's
   * @param tilt how that factor changes over {@link #TILT_SPAN_K}
   * @param curve how it changes with pressure, 1/Pa
   * @param ventCooling 0 isothermal, 1 adiabatic
   */
  record Setting(
      Present present,
      double fillM3,
      double temperatureK,
      double ambientPa,
      double relation,
      double tilt,
      double curve,
      double ventCooling) {}

  private World(
      Setting setting, ClosedVessel vessel, double[] partialPa, double[] headMol, double[] liquid) {
    this.setting = setting;
    this.vessel = vessel;
    this.solver = vessel.solver();
    this.co2 = vessel.solubility().line(Gas.CO2).prepareAt(setting.temperatureK);
    this.partialPa = partialPa;
    this.headMol = headMol;
    this.liquidMol = liquid;
  }

  /**
   * A vessel whose liquid is at rest with its headspace.
   *
   * @param paAbsolute total pressure, Pa absolute
   * @param airPa partial pressure of air, Pa
   */
  static World atRest(Setting setting, double paAbsolute, double airPa) {
    ClosedVessel vessel = vessel(setting, setting.relation);
    GasMix gas = setting.present.vessel().gas();
    double[] partial = new double[GASES];
    vessel.partials(paAbsolute, setting.temperatureK, gas, airPa, partial);
    return rested(setting, vessel, partial, paAbsolute);
  }

  private static World rested(
      Setting setting, ClosedVessel vessel, double[] partialPa, double paAbsolute) {
    double[] head = new double[GASES];
    double[] all = new double[GASES];
    headspaceMol(vessel, partialPa, setting.temperatureK, head);
    vessel.solver().inventoryAt(partialPa, paAbsolute, setting.temperatureK, all);
    for (int i = 0; i < GASES; i++) {
      all[i] -= head[i];
    }
    return new World(setting, vessel, partialPa, head, all);
  }

  /**
   * Solubility off by a factor is the same balance as so much more liquid with the headspace left
   * as it is.
   */
  private static ClosedVessel vessel(Setting setting, double relation) {
    Present present = setting.present;
    double more = (relation - 1) * setting.fillM3;
    return new ClosedVessel(
        present.vessel().volumeM3() + more,
        setting.fillM3 + more,
        present.fillTemperatureK(),
        present.vessel().liquid());
  }

  private static void headspaceMol(
      ClosedVessel vessel, double[] partialPa, double temperatureK, double[] out) {
    double perPa = new DryBlend().prepareAt(temperatureK, partialPa).molPerM3Pa(partialPa);
    for (int i = 0; i < GASES; i++) {
      out[i] = partialPa[i] * perPa * vessel.headspaceM3(temperatureK);
    }
  }

  /** The same with another amount of CO2 in the liquid, kg/m³. */
  World withDissolved(double kgPerM3) {
    double[] liquid = liquidMol.clone();
    liquid[CO2] = Math.max(0, kgPerM3) * liquidM3() / Gas.CO2.molarMass();
    return new World(setting, vessel, partialPa, headMol, liquid);
  }

  /** Where it started, the same for all worlds of a vessel. */
  public Present present() {
    return setting.present;
  }

  /** Liquid volume now, m³. */
  public double liquidM3() {
    return vessel.liquidM3(setting.temperatureK) / setting.relation;
  }

  /** Headspace now, m³. */
  public double headspaceM3() {
    return vessel.headspaceM3(setting.temperatureK);
  }

  /** Cooling of gas that is let out: 0 isothermal, 1 adiabatic. */
  public double ventCooling() {
    return setting.ventCooling;
  }

  /** Temperature now, K. */
  public double temperatureK() {
    return setting.temperatureK;
  }

  /** Atmosphere, Pa absolute. */
  public double ambientPa() {
    return setting.ambientPa;
  }

  /** Dissolved CO2, kg/m³. */
  public double dissolvedKgPerM3() {
    return liquidMol[CO2] * Gas.CO2.molarMass() / liquidM3();
  }

  /** Gas of one kind in the headspace, mol. */
  public double headspaceMol(Gas gas) {
    return headMol[gas.ordinal()];
  }

  /** Composition of the headspace, dry. */
  public GasMix headspaceGas() {
    return GasMix.of(Gas.values(), headMol);
  }

  /** Pressure of the headspace as it is now, Pa gauge. */
  public double paGauge() {
    double sum = vapourPa(setting.temperatureK);
    for (double each : partialPa) {
      sum += each;
    }
    return sum - setting.ambientPa;
  }

  /** Pressure once closed and at rest at a temperature, Pa gauge. */
  public double restPaGauge(double temperatureK) {
    return restPaGauge(temperatureK, 0);
  }

  /**
   * Pressure once closed and at rest with more CO2 made, Pa gauge.
   *
   * @param temperatureK at which temperature, K
   * @param madeKgPerM3 CO2 that fermentation adds, kg/m³ of liquid
   */
  public double restPaGauge(double temperatureK, double madeKgPerM3) {
    return settled(temperatureK, madeKgPerM3).totalPaAbsolute() - setting.ambientPa;
  }

  /** Dissolved CO2 once closed and at rest at a temperature, kg/m³. */
  public double restDissolvedKgPerM3(double temperatureK) {
    return restDissolvedKgPerM3(temperatureK, 0);
  }

  /** The same with more CO2 made, kg/m³ of liquid. */
  public double restDissolvedKgPerM3(double temperatureK, double madeKgPerM3) {
    ClosedSolver used = settled(temperatureK, madeKgPerM3);
    return used.dissolvedKgPerM3(Gas.CO2) * relationAt(temperatureK);
  }

  private ClosedSolver settled(double temperatureK, double madeKgPerM3) {
    double[] all = new double[GASES];
    for (int i = 0; i < GASES; i++) {
      all[i] = headMol[i] + liquidMol[i];
    }
    all[CO2] += madeKgPerM3 * liquidM3() / Gas.CO2.molarMass();
    boolean tilted = setting.tilt != 0 && temperatureK != setting.temperatureK;
    ClosedSolver used = tilted ? vessel(setting, relationAt(temperatureK)).solver() : solver;
    used.settle(all, temperatureK);
    return used;
  }

  private double relationAt(double temperatureK) {
    double span = (temperatureK - setting.temperatureK) / TILT_SPAN_K;
    return setting.relation * (1 + setting.tilt * Math.max(-1, Math.min(1, span)));
  }

  /** Pressure at a temperature if no gas passes between liquid and headspace, Pa gauge. */
  public double unmixedPaGauge(double temperatureK) {
    double room = vessel.headspaceM3(temperatureK);
    if (room <= 0) {
      return Double.POSITIVE_INFINITY;
    }
    double dry = paGauge() + setting.ambientPa - vapourPa(setting.temperatureK);
    double squeezed = dry * temperatureK / setting.temperatureK * headspaceM3() / room;
    return squeezed + vapourPa(temperatureK) - setting.ambientPa;
  }

  /** Pressure right after liquid was drawn off with no gas let in, Pa gauge. */
  public double drawnPaGauge(double drawnM3) {
    double vapour = vapourPa(setting.temperatureK);
    double dry = paGauge() + setting.ambientPa - vapour;
    return dry * headspaceM3() / (headspaceM3() + drawnM3) + vapour - setting.ambientPa;
  }

  /** Pressure after caustic has bound a share of the headspace's CO2, 0..1, Pa gauge. */
  public double causticPaGauge(double boundShare) {
    double total = paGauge() + setting.ambientPa;
    return Vacuum.afterCaustic(total, partialPa[CO2] / total, boundShare) - setting.ambientPa;
  }

  /**
   * CO2 the liquid holds at rest with the present blend at a total pressure, Pa absolute; kg/m³.
   */
  public double equilibriumKgPerM3(double paAbsolute) {
    return equilibriumKgPerM3(paAbsolute, co2Share());
  }

  private double equilibriumKgPerM3(double paAbsolute, double co2Share) {
    double partial = Math.max(0, paAbsolute - vapourPa(setting.temperatureK)) * co2Share;
    double bent = 1 + setting.curve * (paAbsolute - setting.present.pressurePaAbsolute());
    return setting.relation * bent * co2.dissolvedKgPerM3(partial, paAbsolute);
  }

  /** Share of CO2 in the dry headspace, mol/mol. */
  public double co2Share() {
    double sum = 0;
    for (double each : headMol) {
      sum += each;
    }
    return sum > 0 ? headMol[CO2] / sum : 1;
  }

  /** The level that keeps the liquid's gas where it is, with the present blend, Pa gauge. */
  public double holdPaGauge() {
    return holdPaGauge(dissolvedKgPerM3(), setting.temperatureK);
  }

  /**
   * The level at which the liquid comes to hold an amount at a temperature, with the present blend.
   *
   * @param kgPerM3 CO2 wanted, kg/m³
   * @param temperatureK at which temperature, K
   * @return Pa gauge
   */
  public double holdPaGauge(double kgPerM3, double temperatureK) {
    GasLine line = vessel.solubility().line(Gas.CO2).prepareAt(temperatureK);
    double wanted = kgPerM3 / relationAt(temperatureK);
    double share = co2Share();
    double total = setting.ambientPa;
    for (int i = 0; i < MOST_STEPS; i++) {
      double next = line.partialPa(wanted, total) / share + line.vapourPa();
      if (Math.abs(next - total) <= CLOSE_PA) {
        return next - setting.ambientPa;
      }
      total = next;
    }
    return total - setting.ambientPa;
  }

  /** The same vessel right after its headspace was let down to a pressure, Pa gauge. */
  public World vented(double toPaGauge) {
    double vapour = vapourPa(setting.temperatureK);
    double from = paGauge() + setting.ambientPa - vapour;
    double to = Math.max(0, toPaGauge + setting.ambientPa - vapour);
    double[] partial = new double[GASES];
    double[] head = new double[GASES];
    for (int i = 0; i < GASES; i++) {
      partial[i] = partialPa[i] * to / from;
    }
    headspaceMol(vessel, partial, setting.temperatureK, head);
    for (int i = 0; i < GASES; i++) {
      double left = headMol[i] > 0 ? head[i] / headMol[i] : 0;
      head[i] = headMol[i] * Math.pow(left, 1 / (1 + ADIABATIC * setting.ventCooling));
    }
    return new World(setting, vessel, partial, head, liquidMol);
  }

  /** The same vessel at rest at another pressure, Pa gauge, under CO2 alone: air swept out. */
  public World restedUnderCo2(double paGauge) {
    double total = paGauge + setting.ambientPa;
    double[] partial = new double[GASES];
    vessel.partials(total, setting.temperatureK, GasMix.CO2, 0, partial);
    return rested(setting, vessel, partial, total);
  }

  /** Gas in the headspace less that of another world, all species, kg. */
  public double headspaceKgOver(World other) {
    double kg = 0;
    for (Gas gas : Gas.all()) {
      kg += (headMol[gas.ordinal()] - other.headMol[gas.ordinal()]) * gas.molarMass();
    }
    return kg;
  }

  /**
   * CO2 the liquid gives off when held open at a pressure until at rest, kg; what it gives off
   * sweeps other gases out of the headspace.
   */
  public double releasedIfHeldKg(double atPaGauge) {
    double total = atPaGauge + setting.ambientPa;
    World let = vented(Math.min(atPaGauge, paGauge()));
    double headSum = 0;
    for (double each : let.headMol) {
      headSum += each;
    }
    double strange = 1 - co2Share();
    double released = 0;
    for (int i = 0; i < FLUSH_STEPS; i++) {
      double swept = Math.exp(-released / Gas.CO2.molarMass() / Math.max(headSum, 1e-12));
      double rest = equilibriumKgPerM3(total, 1 - strange * swept);
      released = Math.max(0, (dissolvedKgPerM3() - rest) * liquidM3());
    }
    return released;
  }

  /** Gas the liquid takes up per gas the headspace takes up, for a small rise of CO2 pressure. */
  public double capacityRatio() {
    double total = paGauge() + setting.ambientPa;
    double step = 0.01 * total;
    double liquid = (equilibriumKgPerM3(total + step) - equilibriumKgPerM3(total)) * liquidM3();
    double head = step / total * headMol[CO2] * Gas.CO2.molarMass();
    return liquid / head;
  }

  /** Whether at a temperature the liquid takes the whole vessel. */
  public boolean isFullAt(double temperatureK) {
    return vessel.headspaceM3(temperatureK) <= 0;
  }

  private double vapourPa(double temperatureK) {
    return vessel.solubility().vapourPressurePa(temperatureK);
  }
}

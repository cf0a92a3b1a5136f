package tunwarden.forecast.relief;

import java.util.Locale;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.relief.Demand.Source;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.Constants;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Vessel;

/** The credible sources of gas, each at the relieving pressure of one valve. */
public final class Demands {
  /** What relief sizing for gas alone leaves out; to be said with every result. */
  public static final String NOT_COVERED =
      "gas alone: foam and two-phase flow, a blocked or long outlet and back pressure are not"
          + " covered; sizing is for a licensed engineer under the local code";

  private static final double LATENT_J_PER_KG = 2.2e6;
  private static final double SPECIFIC_HEAT_J_PER_KG_K = 4.0e3;
  private static final double STEP_K = 0.5;
  private static final double HOUR_S = 3600;

  private Demands() {}

  /**
   * A fermentation at its peak.
   *
   * @param valve the valve
   * @param liquidM3 fermenting, m³
   * @param madeKgPerM3PerS CO2 made, kg/m³/s; {@link FermentationRate#SCREENING_KG_PER_M3_PER_S}
   *     where nothing is known
   */
  public static Demand fermentation(ReliefCase valve, double liquidM3, double madeKgPerM3PerS) {
    return new Demand(
        Source.FERMENTATION,
        liquidM3 * madeKgPerM3PerS,
        valve.gasKgPerS(),
        String.format(
            Locale.ROOT, "%.2f g/L/h of CO2 from all of the liquid", HOUR_S * madeKgPerM3PerS));
  }

  /**
   * A vessel at the relieving pressure that goes on warming: gas the liquid can no longer hold, and
   * the headspace's own expansion.
   */
  public static Demand warming(ReliefCase valve, Vessel vessel, double kelvinPerS) {
    double givenOff = -vessel.fillM3() * slopeKgPerM3PerK(valve, vessel) * kelvinPerS;
    double expanded =
        valve.relievingPaAbsolute()
            * (vessel.volumeM3() - vessel.fillM3())
            * IsentropicOrifice.molarMass(valve.gas())
            / (Constants.GAS_CONSTANT * valve.temperatureK() * valve.temperatureK())
            * kelvinPerS;
    return new Demand(
        Source.WARMING,
        Math.max(0, givenOff) + expanded,
        valve.gasKgPerS(),
        String.format(
            Locale.ROOT,
            "warming by %.1f °C an hour at %.1f °C, liquid at rest with the gas",
            HOUR_S * kelvinPerS,
            valve.temperatureK() - Constants.ZERO_CELSIUS_K));
  }

  /** A regulator that has failed open: what passes its seat into the vessel. */
  public static Demand supply(ReliefCase valve, double supplyPaAbsolute, ReliefOrifice seat) {
    double flow =
        new IsentropicOrifice(seat.areaM2(), seat.dischargeCoefficient())
            .kgPerS(
                valve.gas(), supplyPaAbsolute, valve.relievingPaAbsolute(), valve.temperatureK());
    return new Demand(
        Source.SUPPLY, flow, valve.gasKgPerS(), "supply regulator open all the way, gas alone");
  }

  /** A supply whose largest flow is stated. */
  public static Demand statedSupply(ReliefCase valve, double kgPerS) {
    return new Demand(Source.SUPPLY, kgPerS, valve.gasKgPerS(), "largest supply flow as stated");
  }

  /**
   * External fire, gas alone: first the dissolved gas is driven out, then the drink boils; the
   * harder of the two on the valve.
   *
   * @param valve the valve
   * @param vessel what it protects
   * @param wattsIn heat input, W, as {@link FireHeat} gives it
   */
  public static Demand fire(ReliefCase valve, Vessel vessel, double wattsIn) {
    double steam = wattsIn / LATENT_J_PER_KG;
    double liquidKg =
        vessel.fillM3() * LiquidDensity.of(vessel.liquid()).kgPerM3(valve.temperatureK());
    double kelvinPerS = wattsIn / (liquidKg * SPECIFIC_HEAT_J_PER_KG_K);
    Demand gas = warming(valve, vessel, kelvinPerS);
    Demand boiling =
        new Demand(
            Source.FIRE,
            steam,
            valve.steamKgPerS(),
            String.format(Locale.ROOT, "%.0f kW boiling the drink, as steam", wattsIn / 1e3));
    if (boiling.share() >= gas.share()) {
      return boiling;
    }
    return new Demand(
        Source.FIRE,
        gas.kgPerS(),
        gas.capacityKgPerS(),
        String.format(Locale.ROOT, "%.0f kW driving out dissolved gas", wattsIn / 1e3));
  }

  /** Change of what the liquid holds with temperature at the relieving pressure, kg/m³/K. */
  private static double slopeKgPerM3PerK(ReliefCase valve, Vessel vessel) {
    LiquidSolubility solubility = LiquidSolubility.of(vessel.liquid());
    double total = valve.relievingPaAbsolute();
    double sum = 0;
    for (int sign = -1; sign <= 1; sign += 2) {
      double kelvin = valve.temperatureK() + sign * STEP_K;
      double partial =
          (total - solubility.vapourPressurePa(kelvin)) * valve.gas().fraction(Gas.CO2);
      sum += sign * solubility.dissolvedKgPerM3(Gas.CO2, partial, total, kelvin);
    }
    return sum / (2 * STEP_K);
  }
}

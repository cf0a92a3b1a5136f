package tunwarden.physics.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import org.junit.jupiter.api.Test;
import tunwarden.physics.flow.IsentropicOrifice.Regime;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.units.Constants;

/** Gas flow against tabulated isentropic values and printed relief-sizing examples. */
class FlowValidation {
  private static final double R = Constants.GAS_CONSTANT;

  /** Computed from the closed forms; spot values of k = 1.35, 1.08, 1.45, 1.50 were read. */
  @Test
  void criticalFlowMeetsTheTabulatedConstants() {
    for (NamedCsvRecord row : rows("c_coefficient")) {
      double k = number(row, "k_dimensionless");
      double psi = IsentropicOrifice.psi(k);
      assertEquals(number(row, "psi_dimensionless"), psi, 6e-6);
      assertEquals(number(row, "C_API_US_520"), 520 * psi, 0.006);
      assertEquals(number(row, "C_ISO4126_bar_mm2_kg_h"), 3.948 * psi, 0.0003);
      double ratio = number(row, "critical_pressure_ratio");
      assertEquals(ratio, IsentropicOrifice.criticalRatio(k), 6e-6);
    }
  }

  /** F2 table of API 520: the nozzle's subcritical flux is F2 sqrt(2 p (p - p2) / ZRT). */
  @Test
  void subcriticalFlowMeetsTheTabulatedFactor() {
    for (NamedCsvRecord row : rows("f2_subcritical")) {
      double k = number(row, "k_dimensionless");
      double ratio = number(row, "P2_over_P1");
      if (ratio > IsentropicOrifice.criticalRatio(k)) {
        double zrt = 55_000;
        double ours = IsentropicOrifice.flux(k, zrt, 2e5, ratio * 2e5);
        double f2 = number(row, "F2_dimensionless");
        double tabulated = f2 * Math.sqrt(2 * 2e5 * (2e5 - ratio * 2e5) / zrt);
        assertEquals(tabulated, ours, 2e-5 * tabulated, row::toString);
      }
    }
  }

  /**
   * Nozzle integration of the real gas, Span and Wagner, at 20 °C and 1, 3, 10 bar gauge: 573.9,
   * 1149.7, 3214.3 kg/(s·m²), computed elsewhere; 1 % asked for, 0.3 % met.
   */
  @Test
  void co2FlowMeetsTheRealGasNozzle() {
    double[][] points = {{1, 573.87}, {3, 1149.7}, {10, 3214.3}};
    IsentropicOrifice square = new IsentropicOrifice(1, 1);
    for (double[] point : points) {
      double from = point[0] * 1e5 + 101_325;
      double ours = square.kgPerS(GasMix.CO2, from, 101_325, 293.15);
      assertEquals(point[1], ours, 0.003 * point[1]);
    }
  }

  /** API Std 520 Part I, gas example 1, SI: inputs read, answer 3698 mm² from memory. */
  @Test
  void apiExampleOne() {
    double zTOverM = 0.9 * 348 / 51;
    double mm2 = Api520.criticalMm2(24_270, 1.11, 0.975, 670, zTOverM);
    assertEquals(3698, mm2, 1.5);
    assertEquals(24_270.0 / 3600, nozzle(mm2, 1.11, 0.975, zTOverM, 670, 101.325), 0.002);
  }

  /** The same in US units: 5.73 in² with C = 328, from memory. */
  @Test
  void apiExampleOneInUsUnits() {
    double in2 = Api520.criticalIn2(53_500, 1.11, 0.975, 97.2, 0.9 * 627 / 51);
    assertEquals(5.73, in2, 0.005);
  }

  /** Example 2, 532 kPa behind it: 4226 mm² with F2 rounded to 0.86, from memory. */
  @Test
  void apiExampleTwo() {
    double zTOverM = 0.9 * 348 / 51;
    assertEquals(0.86, Api520.f2(1.11, 532.0 / 670), 0.006);
    assertEquals(4226, Api520.subcriticalMm2(24_270, 0.86, 0.975, 670, 532, zTOverM), 5);
    double exact =
        Api520.subcriticalMm2(24_270, Api520.f2(1.11, 532.0 / 670), 0.975, 670, 532, zTOverM);
    assertEquals(4248.4, exact, 1);
    double flow = nozzle(exact, 1.11, 0.975, zTOverM, 670, 532);
    assertEquals(24_270.0 / 3600, flow, 0.006);
  }

  /** The same in US units: 6.55 in² with F2 = 0.86, from memory. */
  @Test
  void apiExampleTwoInUsUnits() {
    double in2 = Api520.subcriticalIn2(53_500, 0.86, 0.975, 97.2, 77.2, 0.9 * 627 / 51);
    assertEquals(6.55, in2, 0.005);
  }

  /** API RP 520 7th edition 3.6.2.2: C = 326 and 57.3 psia read; 4.93 in² recomputed. */
  @Test
  void apiExampleOfTheSeventhEdition() {
    double in2 = Api520.criticalIn2(53_500, 1.09, 0.975, 97.2, 0.84 * 627 / 65);
    assertEquals(4.93, in2, 0.005);
    assertEquals(326, Math.rint(520 * IsentropicOrifice.psi(1.09)));
    assertEquals(57.3, 97.2 * IsentropicOrifice.criticalRatio(1.09), 0.3);
  }

  /** A calculation sheet for oxygen at 70 kPa gauge: 30.06 mm² treated as critical, read. */
  @Test
  void lowSetPressureSheet() {
    double mm2 = Api520.criticalMm2(45.787, 1.39, 0.975, 178, 303 / 31.999);
    assertEquals(30.06, mm2, 0.06);
    assertEquals(Regime.SUBCRITICAL, IsentropicOrifice.regime(GasMix.pure(Gas.O2), 178e3, 102.3e3));
  }

  /** Textbook critical pressure of CO2 from 1400 kPa at k = 1.289: 767 kPa, computed. */
  @Test
  void textbookCriticalPressure() {
    assertEquals(767, 1400 * IsentropicOrifice.criticalRatio(1.289), 0.5);
  }

  /** A safety course's CO2 bottle vent: inputs read, 0.04027 kg/s computed elsewhere with Z = 1. */
  @Test
  void bottleVentOfTheSafetyCourse() {
    double area = Math.PI / 4 * 0.00635 * 0.00635;
    double from = 72.5 * 6894.757293168361;
    double zrt = R * 295 / 0.04401;
    assertEquals(0.04027, 0.9 * area * IsentropicOrifice.flux(1.3, zrt, from, 86e3), 0.00001);
  }

  /** ISO 4126-7 and the nozzle agree for CO2 at 2 bar absolute and 4 °C. */
  @Test
  void isoAndTheNozzleAgree() {
    double t = 277.15;
    double z = RealGas.z(Gas.CO2, 2e5, t);
    double iso = Api520.iso4126KgPerH(100, 0.6, 2, 1.3, 44.0095 / (z * t));
    double ours = 3600 * new IsentropicOrifice(100e-6, 0.6).kgPerS(GasMix.CO2, 2e5, 1e5, t);
    assertEquals(iso, ours, 0.0005 * iso);
  }

  /** At sea level CO2 chokes above 0.84 bar gauge and nitrogen above 0.90: computed. */
  @Test
  void theRegimeChangesWhereItShould() {
    double sea = 101_325;
    assertEquals(Regime.SUBCRITICAL, IsentropicOrifice.regime(GasMix.CO2, sea + 0.83e5, sea));
    assertEquals(Regime.CRITICAL, IsentropicOrifice.regime(GasMix.CO2, sea + 0.85e5, sea));
    GasMix n2 = GasMix.pure(Gas.N2);
    assertEquals(Regime.SUBCRITICAL, IsentropicOrifice.regime(n2, sea + 0.89e5, sea));
    assertEquals(Regime.CRITICAL, IsentropicOrifice.regime(n2, sea + 0.91e5, sea));
    assertEquals(Regime.NO_FLOW, IsentropicOrifice.regime(n2, sea, sea));
  }

  @Test
  void flowIsContinuousAcrossTheCriticalRatioAndNeverFallsWithPressure() {
    double last = IsentropicOrifice.flux(1.3, 52_000, 1.018e5, 101_325);
    for (double bar = 1.02; bar < 12; bar += 0.002) {
      double flux = IsentropicOrifice.flux(1.3, 52_000, bar * 1e5, 101_325);
      assertTrue(flux > last && flux < last + 20, "at " + bar);
      last = flux;
    }
    assertEquals(0, IsentropicOrifice.flux(1.3, 52_000, 1e5, 1e5));
    assertEquals(0, IsentropicOrifice.flux(1.3, 52_000, 1e5, 2e5));
  }

  private static double nozzle(
      double mm2, double k, double kd, double zTOverM, double kPa, double backKPa) {
    double zrt = R * 1000 * zTOverM;
    return mm2 * 1e-6 * kd * IsentropicOrifice.flux(k, zrt, kPa * 1e3, backKPa * 1e3);
  }
}

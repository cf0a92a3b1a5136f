package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.physics.Reference.kelvin;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.WagnerPruss1993;

/** The gases beside CO2 against the guideline's check values and the measurements. */
class OtherGasesValidation {
  private static final LiquidSolubility WATER = LiquidSolubility.of(Liquid.WATER);
  private static final double LN_GPA = Math.log(1e9);

  /** All 56 check values of IAPWS G7-04, ln(kH/1 GPa) to four decimals: read. */
  @Test
  void reproducesEveryCheckValueOfTheGuideline() {
    List<NamedCsvRecord> rows = rows("iapws_g704_check");
    assertEquals(56, rows.size());
    for (NamedCsvRecord row : rows) {
      Gas gas = Gas.ofSymbol(row.getField("gas")).orElseThrow();
      double ours = IapwsG704.lnHenryPa(gas, number(row, "T_K")) - LN_GPA;
      double published = number(row, "ln_kH_per_GPa_published");
      assertEquals(published, ours, 0.5001e-4, () -> gas + " at " + row.getField("T_K"));
    }
  }

  /** Rettich's measurements, read: the fits meet each within 0.2 %. */
  @Test
  void meetsTheMeasuredHenryFugacities() {
    for (NamedCsvRecord row : rows("o2_n2_water_henry_measured")) {
      Gas gas = Gas.ofSymbol(row.getField("gas")).orElseThrow();
      double ours = Math.exp(RettichFit.lnHenryPa(gas, number(row, "T_K"))) / 1e9;
      double measured = number(row, "H_measured_GPa_molefrac_at_psat");
      assertEquals(measured, ours, 0.002 * measured, () -> gas + " at " + row.getField("T_K"));
    }
  }

  /** García and Gordon 1992 as computed by another program: oxygen in water under moist air. */
  @Test
  void oxygenUnderMoistAirIsWhatTheLimnologistsPrint() {
    for (NamedCsvRecord row : rows("o2_air_saturation_gsw")) {
      double t = kelvin(number(row, "t_C"));
      double total = 101_325;
      double oxygen = 0.20946 * (total - WagnerPruss1993.pa(t));
      double perM3 = WATER.dissolvedKgPerM3(Gas.O2, oxygen, total, t);
      double mgPerKg = 1e6 * perM3 / Kell1975.kgPerM3(t);
      double printed = number(row, "O2_mg_per_kg");
      assertEquals(printed, mgPerKg, 0.006 * printed, () -> "at " + row.getField("t_C"));
    }
  }

  /** Weiss 1970 through the pages' table: argon and nitrogen Bunsen coefficients within 2 %. */
  @Test
  void bunsenCoefficientsAreNearWeiss1970() {
    for (NamedCsvRecord row : rows("n2_o2_ar_water")) {
      Gas gas = Gas.ofSymbol(row.getField("gas")).orElseThrow();
      double t = kelvin(number(row, "t_C"));
      double atm = 101_325;
      double perM3 = WATER.dissolvedKgPerM3(gas, atm, atm + WagnerPruss1993.pa(t), t);
      double bunsen = perM3 / gas.molarMass() * 22.4e-3;
      double printed = number(row, "Bunsen_Weiss1970_L_per_L_atm");
      assertEquals(printed, bunsen, 0.025 * printed, () -> gas + " at " + row.getField("t_C"));
    }
  }
}

package tunwarden.physics.gas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static tunwarden.physics.Reference.kelvin;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import org.junit.jupiter.api.Test;
import tunwarden.units.Constants;

/** Real headspace gas against Span and Wagner 1996 and mixture models, computed elsewhere. */
class RealGasValidation {
  private static final double CM3 = 1e6;

  /** 0.2 % in fugacity to 10 bar is asked for; 0.014 % is met, and 0.03 % at 20 bar. */
  @Test
  void fugacityOfCo2MeetsSpanAndWagner() {
    for (NamedCsvRecord row : rows("co2_gas_Z_phi")) {
      double bar = number(row, "p_bar");
      if (bar <= 20) {
        double t = kelvin(number(row, "t_C"));
        double tabulated = number(row, "fugacity_coefficient");
        double ours = RealGas.fugacityCoefficient(Gas.CO2, bar * 1e5, t);
        double within = bar <= 10 ? 0.0002 : 0.0005;
        assertEquals(tabulated, ours, within * tabulated, row::toString);
      }
    }
  }

  @Test
  void compressibilityOfCo2MeetsSpanAndWagner() {
    for (NamedCsvRecord row : rows("co2_gas_Z_phi")) {
      double bar = number(row, "p_bar");
      if (bar <= 20) {
        double tabulated = number(row, "Z");
        double ours = RealGas.z(Gas.CO2, bar * 1e5, kelvin(number(row, "t_C")));
        assertEquals(tabulated, ours, 0.001 * tabulated, row::toString);
      }
    }
  }

  /** Densities of CO2 and N2 by other programs' reference equations, to 11 bar. */
  @Test
  void compressibilityOfTheOthersIsWithinATenthOfAPerCent() {
    for (NamedCsvRecord row : rows("gas_k_and_z")) {
      GasMix mix =
          switch (row.getField("gas")) {
            case "CO2" -> GasMix.CO2;
            case "N2" -> GasMix.pure(Gas.N2);
            default -> throw new IllegalStateException(row.getField("gas"));
          };
      double tabulated = number(row, "Z_dimensionless");
      double pa = number(row, "p_bar_abs") * 1e5;
      double ours = RealGas.z(mix, pa, kelvin(number(row, "T_degC")));
      assertEquals(tabulated, ours, 0.001, row::toString);
    }
  }

  @Test
  void secondVirialCoefficientsAreNearTheReferenceEquations() {
    for (NamedCsvRecord row : rows("second_virial")) {
      double t = kelvin(number(row, "t_C"));
      assertEquals(number(row, "B_CO2_Weiss1974_cm3_mol"), CM3 * RealGas.second(Gas.CO2, t), 0.006);
      assertEquals(number(row, "B_CO2_SpanWagner_cm3_mol"), CM3 * RealGas.second(Gas.CO2, t), 0.75);
      assertEquals(number(row, "B_N2_cm3_mol"), CM3 * RealGas.second(Gas.N2, t), 2);
      assertEquals(number(row, "B_O2_cm3_mol"), CM3 * RealGas.second(Gas.O2, t), 2);
    }
  }

  /** 10 cm³/mol in a cross coefficient is 0.2 % of a fugacity at 5 bar in an even blend. */
  @Test
  void crossVirialCoefficientsAreNearTheMixtureModel() {
    for (NamedCsvRecord row : rows("cross_virial")) {
      double t = kelvin(number(row, "t_C"));
      assertEquals(number(row, "B12_CO2_N2_cm3_mol"), cross(Gas.N2, t), 6);
      assertEquals(number(row, "B12_CO2_O2_cm3_mol"), cross(Gas.O2, t), 10);
      assertEquals(number(row, "B12_CO2_Ar_cm3_mol"), cross(Gas.AR, t), 10);
      double ideal = CM3 * (RealGas.second(Gas.N2, t) + RealGas.second(Gas.O2, t)) / 2;
      assertEquals(number(row, "B12_N2_O2_cm3_mol"), ideal, 2);
    }
  }

  private static double cross(Gas gas, double t) {
    double mean = (RealGas.second(Gas.CO2, t) + RealGas.second(gas, t)) / 2;
    return CM3 * (mean + RealGas.excessWithCo2(gas, t));
  }

  /** The corresponding-states rule must give the pairs it is used for: tried on CO2–N2. */
  @Test
  void tsonopoulosIsFairOnAPairThatIsKnown() {
    for (NamedCsvRecord row : rows("cross_virial")) {
      double t = kelvin(number(row, "t_C"));
      double ours = CM3 * Tsonopoulos1974.cross(Gas.CO2, Gas.N2, t);
      assertEquals(number(row, "B12_CO2_N2_cm3_mol"), ours, 8, () -> "at " + t);
    }
  }

  /** ln φ is the slope of n·g with one amount, taken here numerically: the blend is consistent. */
  @Test
  void fugacityCoefficientsBelongToTheCompressibility() {
    GasMix mix = GasMix.parse("40N2/60CO2");
    double t = kelvin(4);
    double pa = 6e5;
    double weighted = 0.4 * lnPhi(Gas.N2, mix, pa, t) + 0.6 * lnPhi(Gas.CO2, mix, pa, t);
    double integral = 0;
    int steps = 2000;
    for (int i = 0; i < steps; i++) {
      double p = pa * (i + 0.5) / steps;
      integral += (RealGas.z(mix, p, t) - 1) / p * (pa / steps);
    }
    assertEquals(integral, weighted, 1e-8);
  }

  private static double lnPhi(Gas gas, GasMix mix, double pa, double t) {
    return Math.log(RealGas.fugacityCoefficient(gas, mix, pa, t));
  }

  /** Densities at the standard conditions in use, reference equations computed elsewhere. */
  @Test
  void densitiesAtStandardConditionsAreMet() {
    int compared = 0;
    for (NamedCsvRecord row : rows("gas_standard_conditions")) {
      var gas = Gas.ofSymbol(row.getField("gas"));
      if (gas.isPresent()) {
        double t = kelvin(number(row, "T_degC"));
        double pa = number(row, "p_Pa");
        double z = RealGas.z(gas.get(), pa, t);
        double density = pa * gas.get().molarMass() / (z * Constants.GAS_CONSTANT * t);
        double tabulated = number(row, "rho_kg_m3");
        assertEquals(tabulated, density, 0.0003 * tabulated, row::toString);
        compared++;
      }
    }
    assertTrue(compared >= 12, "rows compared: " + compared);
  }

  /** One litre of CO2 at 0 °C and 1 atm weighs 1.97681 g: the trade's real-gas volume. */
  @Test
  void theVolumeOfCarbonationIsTheDensityOfTheRealGas() {
    double z = RealGas.z(Gas.CO2, 101_325, 273.15);
    double density =
        101_325 * Gas.CO2.molarMass() / (z * Constants.GAS_CONSTANT * Constants.ZERO_CELSIUS_K);
    assertEquals(Constants.CO2_VOLUME_KG_PER_M3, density, 0.0001);
    assertEquals(
        Constants.CO2_IDEAL_VOLUME_KG_PER_M3, Gas.CO2.molarMass() * 1000 / 22.414, 0.00005);
  }
}

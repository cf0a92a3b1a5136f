package tunwarden.physics.liquid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.physics.Reference.kelvin;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.units.Extract;

/** Densities and vapour pressure against tables computed or printed elsewhere. */
class DensityValidation {
  /** IAPWS-95 at one atmosphere, computed: density 0.002 %, vapour pressure 0.05 %. */
  @Test
  void waterIsWaterOfTheFormulation() {
    for (NamedCsvRecord row : rows("water_density_psat_vphi")) {
      double t = kelvin(number(row, "t_C"));
      double density = number(row, "rho_kg_m3");
      assertEquals(density, Kell1975.kgPerM3(t), 2e-5 * density, row::toString);
      double vapour = number(row, "p_sat_kPa") * 1e3;
      assertEquals(vapour, WagnerPruss1993.pa(t), 0.0008 * vapour, row::toString);
      double slope = (Kell1975.kgPerM3(t + 0.1) - Kell1975.kgPerM3(t - 0.1)) / 0.2;
      double expansion = -1e6 * slope / Kell1975.kgPerM3(t);
      assertEquals(number(row, "thermal_expansion_1e-6_per_K"), expansion, 1.5, row::toString);
    }
  }

  @Test
  void compressibilityIsThatOfTheFormulation() {
    for (NamedCsvRecord row : rows("liquid_full_dPdT")) {
      double perBar = number(row, "kappa_T_1_per_bar");
      double ours = 1e5 * Kell1975.compressibilityPerPa(kelvin(number(row, "T_degC")));
      assertEquals(perBar, ours, 0.005 * perBar, row::toString);
    }
  }

  /** Liquid expansion from a cold fill, computed from IAPWS-95. */
  @Test
  void aColdFillExpandsAsTabulated() {
    for (NamedCsvRecord row : rows("fill_limits_water")) {
      double cold = Kell1975.kgPerM3(kelvin(number(row, "T_fill_degC")));
      double hot = Kell1975.kgPerM3(kelvin(number(row, "T_hot_degC")));
      assertEquals(number(row, "liquid_expansion_pct"), 100 * (cold / hot - 1), 0.002);
    }
  }

  /** OIML R 22, constants read; the table was computed from them by another program. */
  @Test
  void ethanolWaterIsTheAlcoholometricFormula() {
    for (NamedCsvRecord row : rows("ethanol_water_density_oiml")) {
      double volume = number(row, "ethanol_percent_vol_20C") / 100;
      double mass = OimlR22.massFraction(volume);
      assertEquals(number(row, "ethanol_percent_mass"), 100 * mass, 0.0002, row::toString);
      double ours = OimlR22.kgPerM3(mass, kelvin(number(row, "t_C")));
      assertEquals(number(row, "rho_kg_m3"), ours, 0.002, row::toString);
    }
  }

  /** Degrees Plato: two formulas from memory that agree, and NBS Circular 440 from memory. */
  @Test
  void sugarWaterIsThePlatoTable() {
    for (NamedCsvRecord row : rows("sucrose_density_plato")) {
      double plato = number(row, "degrees_Plato_or_percent_w_w");
      assertEquals(number(row, "SG_20_20"), SugarWater.gravityAt20C(plato), 0.00002);
      assertEquals(plato, Extract.platoFromGravity(number(row, "SG_20_20")), 0.01);
      double density = SugarWater.ofPlato(plato).kgPerM3(kelvin(20));
      assertEquals(number(row, "rho20_kg_m3"), density, 0.03, row::toString);
      String circular = row.getField("rho20_NBS440_kg_m3");
      if (!circular.isBlank()) {
        assertEquals(Double.parseDouble(circular), density, 0.1, row::toString);
      }
    }
  }

  @Test
  void extractAndGravityAreInverse() {
    for (double plato = 0.5; plato <= 25; plato += 0.5) {
      assertEquals(plato, Extract.platoFromGravity(Extract.gravityFromPlato(plato)), 1e-9);
    }
  }

  /** Ethanol and sugar together: a beer of 5 % vol and 4 °P weighs about 1007.7 kg/m³ at 20 °C. */
  @Test
  void aDrinkIsEthanolWaterTimesSugarWater() {
    Liquid beer =
        new Liquid(
            LiquidKind.BEER,
            OptionalDouble.of(0.05),
            OptionalDouble.of(4),
            OptionalDouble.empty(),
            BeerMethod.EUROPEAN,
            Map.of());
    double expected = 991.055 * Extract.gravityFromPlato(4);
    assertEquals(expected, LiquidDensity.of(beer).kgPerM3(kelvin(20)), 0.02);
  }
}

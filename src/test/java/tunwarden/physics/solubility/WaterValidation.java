package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.physics.Reference.kelvin;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.Liquid;

/** CO2 in water against the computed grid and the measured points. */
class WaterValidation {
  private static final LiquidSolubility WATER = LiquidSolubility.of(Liquid.WATER);

  /** Grid: Weiss 1974 with Span and Wagner fugacity and García volume, computed elsewhere. */
  @Test
  void isWithinTheComputedGrid() {
    double worst = 0;
    for (NamedCsvRecord row : rows("co2_water_pT_computed")) {
      double t = kelvin(number(row, "t_C"));
      double total = number(row, "p_total_bar") * 1e5;
      double partial = total - WATER.vapourPressurePa(t);
      double ours = WATER.dissolvedKgPerM3(Gas.CO2, partial, total, t);
      worst = Math.max(worst, Math.abs(ours / number(row, "g_per_L_solution") - 1));
    }
    assertEquals(0, worst, 0.001, "worst relative difference; 0.006 is asked for");
  }
}

package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.physics.Reference.kelvin;
import static tunwarden.physics.Reference.number;
import static tunwarden.physics.Reference.rows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;

/** Wine against the EU relation and the published champagne figures. */
class WineValidation {
  private static double underCo2(double alcohol, double sugar, double total, double t) {
    LiquidSolubility wine =
        LiquidSolubility.of(
            new Liquid(
                LiquidKind.SPARKLING_WINE,
                OptionalDouble.of(alcohol),
                OptionalDouble.empty(),
                OptionalDouble.of(sugar),
                BeerMethod.EUROPEAN,
                Map.of()));
    return wine.dissolvedKgPerM3(Gas.CO2, total - wine.vapourPressurePa(t), total, t);
  }

  /** The relation of Regulation 2676/90 at 20 °C, read: 1 % asked for, its rounding reached. */
  @Test
  void isTheEuRelationAtTwentyDegrees() {
    for (NamedCsvRecord row : rows("wine_co2_eu20C")) {
      double printed = number(row, "k_g_per_L_per_1e5Pa");
      double alcohol = number(row, "ethanol_percent_vol") / 100;
      double sugar = number(row, "sugar_g_per_L");
      for (double bar = 1; bar <= 8; bar++) {
        double ours = underCo2(alcohol, sugar, bar * 1e5, kelvin(20)) / bar;
        assertEquals(printed, ours, 0.0001, row::toString);
      }
    }
  }

  /** Champagne at 10 °C, about 2.1 g/L per bar: Liger-Belair and Cilindre 2021, read. */
  @Test
  void isNearThePublishedChampagneWhenCold() {
    assertEquals(2.1, underCo2(0.125, 10, 1e5, kelvin(10)), 0.1);
  }

  /** Sealed bottles of Liger-Belair 2017 (read): 11.24 and 11.08 g/L at 6 and 12 °C. */
  @Test
  void isNearTheSealedBottles() {
    assertEquals(11.24, underCo2(0.125, 10, 4.7e5, kelvin(6)), 0.03 * 11.24);
    assertEquals(11.08, underCo2(0.125, 10, 5.8e5, kelvin(12)), 0.03 * 11.08);
    assertEquals(10.77, underCo2(0.125, 10, 7.5e5, kelvin(20)), 0.03 * 10.77);
  }
}

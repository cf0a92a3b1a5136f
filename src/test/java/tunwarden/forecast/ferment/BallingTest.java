package tunwarden.forecast.ferment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static tunwarden.forecast.ReferenceRows.number;

import org.junit.jupiter.api.Test;
import tunwarden.forecast.ReferenceRows;
import tunwarden.units.Extract;

/** Validation against balling_examples.csv and fermentation_rate_conversion.csv (both computed). */
class BallingTest {
  private static final double ROUNDING = 5e-5;

  @Test
  void reproducesTheExamples() {
    for (var row : ReferenceRows.of("balling_examples")) {
      double original = number(row, "OE_degP");
      double apparent = number(row, "AE_degP");
      assertEquals(
          number(row, "RE_pct_ww"), Balling.realExtract(original, apparent), 1.01 * ROUNDING);
      assertEquals(
          number(row, "alcohol_g_per_100g"),
          Balling.alcoholByMass(original, apparent),
          1.01 * ROUNDING);
      assertEquals(
          number(row, "CO2_produced_g_per_100g_beer"),
          Balling.co2ByMass(original, apparent),
          1.01 * ROUNDING);
    }
  }

  @Test
  void twelvePlatoGivesAboutThreePointNineKilogramsPerHectolitre() {
    assertEquals(38.7, Balling.co2ToCome(12, 12, 2.5), 0.4);
  }

  @Test
  void whatCameAndWhatIsToComeAddUp() {
    double whole = Balling.co2ToCome(12, 12, 2.5) / (1000 * Extract.gravityFromPlato(12));
    double early = Balling.co2ToCome(12, 12, 6) / (1000 * Extract.gravityFromPlato(12));
    double late = Balling.co2ToCome(12, 6, 2.5) / (1000 * Extract.gravityFromPlato(6));
    double massLeft = 1 - early - 0.11 / 0.9565 * early;
    assertEquals(whole, early + late * massLeft, 1e-4 * whole);
  }

  @Test
  void nothingIsToComeAtTheEnd() {
    assertEquals(0, Balling.co2ToCome(12, 2.5, 2.5), 1e-12);
  }

  @Test
  void ratesFollowTheConversionTable() {
    for (var row : ReferenceRows.of("fermentation_rate_conversion")) {
      double perHour =
          3600 * FermentationRate.ofDrop(number(row, "apparent_extract_drop_degP_per_day"));
      assertEquals(number(row, "CO2_g_per_L_h"), perHour, 1e-3 * perHour);
    }
    assertTrue(FermentationRate.UNKNOWN.lowKgPerM3PerS() < FermentationRate.ofDrop(1));
  }
}

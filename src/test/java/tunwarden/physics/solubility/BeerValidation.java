package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
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
import tunwarden.units.Constants;
import tunwarden.units.Unit;

/** Beer against the trade's chart and table. */
class BeerValidation {
  private static final LiquidSolubility EUROPEAN =
      beer(BeerMethod.EUROPEAN, OptionalDouble.empty());
  private static final LiquidSolubility CHART = beer(BeerMethod.CHART, OptionalDouble.empty());

  private static LiquidSolubility beer(BeerMethod method, OptionalDouble extract) {
    return LiquidSolubility.of(
        new Liquid(
            LiquidKind.BEER,
            OptionalDouble.empty(),
            extract,
            OptionalDouble.empty(),
            method,
            Map.of()));
  }

  private static double underCo2(LiquidSolubility beer, double total, double t) {
    return beer.dissolvedKgPerM3(Gas.CO2, total - beer.vapourPressurePa(t), total, t);
  }

  /** Chart read from D. Miller's copy: every point within 0.07 volume; the worst is 0.056. */
  @Test
  void isWithinTheChart() {
    int points = 0;
    for (NamedCsvRecord row : rows("beer_chart_volumes")) {
      double t = Unit.FAHRENHEIT.toSi(number(row, "temperature_F"));
      double total = Unit.PSI.toSi(number(row, "gauge_pressure_psi") + 14.7);
      double volumes = underCo2(CHART, total, t) / Constants.CO2_VOLUME_KG_PER_M3;
      assertEquals(number(row, "co2_volumes"), volumes, 0.07, row::toString);
      points++;
    }
    assertEquals(194, points);
  }

  /** g/L table of the European equation, read: within its rounding at every point. */
  @Test
  void isTheEuropeanEquationWithinItsRounding() {
    for (NamedCsvRecord row : rows("beer_table_gL")) {
      double t = kelvin(number(row, "t_C"));
      double total = (number(row, "gauge_pressure_bar") + 1.013) * 1e5;
      double ours = underCo2(EUROPEAN, total, t);
      assertEquals(number(row, "CO2_g_per_L_table"), ours, 0.0501, row::toString);
      assertEquals(number(row, "CO2_g_per_L_equation"), ours, 0.00051, row::toString);
    }
  }

  /** Lager of 5 % vol at 6 °C, about 2.4 g/L per bar: Liger-Belair and Cilindre 2021, read. */
  @Test
  void isNearThePublishedLager() {
    double perBar = underCo2(EUROPEAN, 1e5, kelvin(6));
    assertEquals(2.4, perBar, 0.18);
  }

  /** The two relations differ by 1 to 2 % as the trade knows. */
  @Test
  void theTwoRelationsDifferByAFewPerCent() {
    for (double c = 0; c <= 15; c += 1) {
      double total = 2e5;
      double ratio = underCo2(EUROPEAN, total, kelvin(c)) / underCo2(CHART, total, kelvin(c));
      assertTrue(ratio > 1 && ratio < 1.03, "at " + c + " the ratio is " + ratio);
    }
  }

  /** In a blend the beer keeps its factor on water: within 1 % of the relation on CO2 alone. */
  @Test
  void aBlendChangesTheDrinkOnlyThroughTheGas() {
    double t = kelvin(4);
    double vapour = EUROPEAN.vapourPressurePa(t);
    double alone = EUROPEAN.dissolvedKgPerM3(Gas.CO2, 1.2e5, 1.2e5 + vapour, t);
    double blended = EUROPEAN.dissolvedKgPerM3(Gas.CO2, 1.2e5, 4e5, t);
    LiquidSolubility water = LiquidSolubility.of(Liquid.WATER);
    double waterAlone = water.dissolvedKgPerM3(Gas.CO2, 1.2e5, 1.2e5 + vapour, t);
    double waterBlended = water.dissolvedKgPerM3(Gas.CO2, 1.2e5, 4e5, t);
    assertEquals(waterBlended / waterAlone, blended / alone, 1e-12);
    assertEquals(alone, blended, 0.02 * alone);
  }

  /** More extract holds less gas; an estimate of this project, no source. */
  @Test
  void aHeavyBeerHoldsLessThanALightOne() {
    double t = kelvin(4);
    double light = underCo2(beer(BeerMethod.EUROPEAN, OptionalDouble.of(2)), 2e5, t);
    double heavy = underCo2(beer(BeerMethod.EUROPEAN, OptionalDouble.of(9)), 2e5, t);
    assertEquals(0.958, heavy / light, 0.005);
  }
}

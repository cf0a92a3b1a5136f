package tunwarden.forecast.relief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.forecast.ReferenceRows.number;

import org.junit.jupiter.api.Test;
import tunwarden.forecast.ReferenceRows;
import tunwarden.vessel.ReliefSetting;

/** Validation against prv_margins.csv, computed from the rules of the standards. */
class ReliefLevelsTest {
  private static final double BAR = 1e5;

  /** The table is rounded to 1e-4 bar. */
  private static final double ROUNDING_PA = 10;

  @Test
  void levelsFollowTheRulesAcrossTheTable() {
    for (var row : ReferenceRows.of("prv_margins")) {
      double set = number(row, "set_bar_g") * BAR;
      ReliefLevels asme = ReliefLevels.of(ReliefSetting.asme(set));
      ReliefLevels iso = ReliefLevels.of(ReliefSetting.iso4126(set));
      same(row, "earliest_open_ASME_bar_g", asme.earliestLiftPaGauge());
      same(row, "earliest_open_ISO_bar_g", iso.earliestLiftPaGauge());
      same(row, "op_limit_greater_of_10pct_or_5psi_bar_g", iso.operatingCeilingPaGauge());
      same(row, "lowest_reseat_ISO_bar_g", Math.max(0, iso.lowestReseatPaGauge()));
      same(row, "accum_single_bar_g", asme.accumulationPaGauge());
      assertEquals(set + Math.max(0.1 * set, 0.1 * BAR), iso.accumulationPaGauge(), 1e-6);
    }
  }

  private static void same(
      de.siegmar.fastcsv.reader.NamedCsvRecord row, String column, double paGauge) {
    assertEquals(number(row, column) * BAR, paGauge, ROUNDING_PA, column + " of " + row);
  }
}

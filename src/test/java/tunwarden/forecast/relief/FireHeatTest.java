package tunwarden.forecast.relief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static tunwarden.forecast.ReferenceRows.number;

import org.junit.jupiter.api.Test;
import tunwarden.forecast.ReferenceRows;

/** Validation against fire_heat_input.csv, computed from API 521. */
class FireHeatTest {
  @Test
  void heatFollowsTheTable() {
    for (var row : ReferenceRows.of("fire_heat_input")) {
      double area = number(row, "wetted_area_m2");
      double drained = number(row, "Q_adequate_drainage_F1_kW") * 1000;
      double undrained = number(row, "Q_no_drainage_F1_kW") * 1000;
      assertEquals(drained, FireHeat.watts(area, true), 1e-3 * drained);
      assertEquals(undrained, FireHeat.watts(area, false), 1e-3 * undrained);
    }
  }
}

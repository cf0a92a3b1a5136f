package tunwarden.forecast.room;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.hipparchus.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import tunwarden.forecast.ReferenceRows;
import tunwarden.vessel.Room;

class RoomAirTest {
  private static final double HOUR = 3600;

  /** Worked example E8 of relief_worked_examples.csv, published as 0.006. */
  @Test
  void dilutionExample() {
    var row = ReferenceRows.row("relief_worked_examples", "id", "E8");
    Room room = new Room(500, 1 / HOUR);
    double end = RoomAir.after(0, 0, 5 / HOUR, room, HOUR);
    assertEquals(ReferenceRows.number(row, "recomputed_unrounded"), end, 5e-8);
    assertEquals(Double.parseDouble(row.getField("published_answer")), end, 5e-4);
  }

  @Test
  void withoutVentilationItOnlyRises() {
    assertEquals(0.01, RoomAir.after(0, 0.0004, 5 / HOUR, new Room(500, 0), HOUR), 1e-12);
  }

  /** 1 kg in 100 m³ gives 5,440 ppm above what was there (computed). */
  @Test
  void oneKilogramInAHundredCubicMetres() {
    double gas = RoomAir.volumeM3(1);
    double ppm = RoomAir.ppm(RoomAir.afterRelease(gas, new Room(100, 0)));
    assertEquals(5440 + 420, ppm, 10);
  }

  @Test
  void thePeakIsTheHighestPointOfTheNumericalSolution() {
    for (double release : new double[] {1e-5, 1e-4, 2 / HOUR, 1e-3}) {
      Room room = new Room(120, 2 / HOUR);
      double highest = 0;
      for (double t = 0; t < 60 * HOUR; t += 60) {
        highest = Math.max(highest, numerically(0.4, 3, release, room, t));
      }
      double peak = RoomAir.peak(0.4, 3, release, room) - RoomAir.BACKGROUND;
      assertEquals(highest, peak, 2e-3 * highest, "release rate " + release);
    }
  }

  /** Convolution of the source with the room's own decay. */
  private static double numerically(
      double once, double following, double release, Room room, double t) {
    double n = room.airChangesPerS();
    double washed = once * Math.exp(-n * t) / room.volumeM3();
    if (t == 0) {
      return washed;
    }
    var integrator = new IterativeLegendreGaussIntegrator(8, 1e-6, 1e-12);
    double fed =
        integrator.integrate(
            100_000, s -> following * release * Math.exp(-release * s - n * (t - s)), 0, t);
    return washed + fed / room.volumeM3();
  }

  @Test
  void limitsInForceAreThoseOfTheTable() {
    var table =
        ReferenceRows.of("co2_exposure_limits").stream()
            .filter(r -> r.getField("value_ppm").matches("\\d+"))
            .filter(r -> !r.getField("status").startsWith("vacated"))
            .map(r -> (int) ReferenceRows.number(r, "value_ppm"))
            .sorted()
            .toList();
    var ours = ExposureLimit.IN_FORCE.stream().map(limit -> (int) limit.ppm()).sorted().toList();
    assertEquals(table, ours);
  }

  @Test
  void theVacatedValueIsNotAmongThem() {
    var values =
        ExposureLimit.IN_FORCE.stream()
            .map(ExposureLimit::ppm)
            .collect(Collectors.toCollection(TreeSet::new));
    assertEquals(new TreeSet<>(Arrays.asList(5_000.0, 15_000.0, 30_000.0, 40_000.0)), values);
    assertEquals(values.first(), ExposureLimit.DAY_PPM);
    assertTrue(ExposureLimit.NIOSH_IDLH.isExceededBy(40_001));
  }

  /** Oxygen falls to 19.5 % only at 6.9 % CO2 (computed): no guard against CO2. */
  @Test
  void oxygenAlarmsComeLate() {
    Room room = new Room(100, 0);
    double gas = 6.9;
    assertEquals(ExposureLimit.LEAST_OXYGEN, RoomAir.oxygenLeft(gas, room), 2e-4);
    assertTrue(ExposureLimit.NIOSH_IDLH.isExceededBy(RoomAir.ppm(gas / 100)));
  }
}

package tunwarden.rehearse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;

/** The simulated vessels do what their scenario says and obey the balance they are built on. */
class RehearsalTest {
  private static final Instant START = RehearsalLog.START;
  private static final double BAR = 1e5;

  @ParameterizedTest
  @EnumSource(Scenario.class)
  void everyScenarioGivesAWholeLogOfFiniteRows(Scenario scenario) {
    Rehearsal rehearsal = Rehearsal.logged(scenario, 1, START);
    List<double[]> rows = play(rehearsal);
    assertTrue(rows.size() > 5000, scenario + " has " + rows.size() + " rows");
    assertEquals(Scenario.ofWord(scenario.word()).orElseThrow(), scenario);
  }

  @Test
  void lostCoolingLiftsTheValveBetweenItsTolerances() {
    Rehearsal rehearsal = Rehearsal.logged(Scenario.COOLING_LOST, 1, START);
    double peak = 0;
    boolean lifted = false;
    for (LogRow row = rehearsal.next(); row != null; row = rehearsal.next()) {
      peak = Math.max(peak, rehearsal.truth().paGauge());
      lifted |= rehearsal.truth().lostKg() > 0;
    }
    assertTrue(lifted);
    assertEquals(1.46 * BAR, peak, 500);
    double content = rehearsal.truth().co2Kg() + rehearsal.truth().lostKg();
    assertTrue(rehearsal.truth().lostKg() < 0.3 * content, "lost " + rehearsal.truth().lostKg());
  }

  @Test
  void aShutVesselKeepsItsGas() {
    Rehearsal rehearsal = Rehearsal.logged(Scenario.UNPURGED, 1, START);
    double before = rehearsal.truth().co2Kg();
    play(rehearsal);
    assertEquals(before, rehearsal.truth().co2Kg(), 1e-9 * before);
  }

  @Test
  void whatLeavesThroughALeakIsMissingAfterwards() {
    Rehearsal rehearsal = Rehearsal.logged(Scenario.SLOW_LEAK, 1, START);
    double before = rehearsal.truth().co2Kg();
    List<double[]> rows = play(rehearsal);
    double lost = rehearsal.truth().lostKg();
    assertTrue(lost > 0.2, "lost " + lost);
    assertEquals(before - lost, rehearsal.truth().co2Kg(), 0.01 * lost);
    assertTrue(rows.get(rows.size() - 1)[0] < rows.get(0)[0] - 0.05 * BAR);
  }

  @Test
  void aVentedTankComesBackMostOfTheWay() {
    List<double[]> rows = play(Rehearsal.logged(Scenario.VENT_AND_RETURN, 1, START));
    double least = rows.stream().mapToDouble(r -> r[0]).min().orElseThrow();
    double first = rows.get(0)[0];
    double last = rows.get(rows.size() - 1)[0];
    assertTrue(least < 0.4 * first, "vented to " + least);
    assertTrue(last > 0.85 * first && last < 0.99 * first, "came back to " + last);
  }

  @Test
  void coldCrashPullsAVacuum() {
    List<double[]> rows = play(Rehearsal.logged(Scenario.COLD_CRASH, 1, START));
    assertTrue(rows.get(rows.size() - 1)[0] < -0.1 * BAR);
  }

  @Test
  void aFrozenSignalStandsStillWhileTheTemperatureRises() {
    List<double[]> rows = play(Rehearsal.logged(Scenario.FROZEN_SENSOR, 1, START));
    int frozen = 5 * 360 + 2;
    double held = rows.get(frozen)[0];
    assertTrue(rows.subList(frozen, rows.size()).stream().allMatch(r -> r[0] == held));
    assertTrue(rows.get(rows.size() - 1)[1] > rows.get(frozen)[1] + 3);
  }

  @Test
  void theCellarIsTheSameEveryTimeItIsOpened() throws Exception {
    RehearsalCellar cellar = new RehearsalCellar(7, START, Duration.ofSeconds(10));
    assertEquals(3, cellar.vessels().size());
    assertEquals(first(cellar.open()), first(cellar.open()));
    assertFalse(
        first(cellar.open())
            .equals(first(new RehearsalCellar(8, START, Duration.ofSeconds(10)).open())));
  }

  private static List<LogRow> first(RowSource source) throws Exception {
    List<LogRow> rows = new ArrayList<>();
    for (int i = 0; i < 300; i++) {
      rows.add(source.next());
    }
    return rows;
  }

  private static List<double[]> play(Rehearsal rehearsal) {
    List<double[]> rows = new ArrayList<>();
    for (LogRow row = rehearsal.next(); row != null; row = rehearsal.next()) {
      double[] values = new double[2];
      row.samples()
          .forEach(
              s -> {
                if (s instanceof Reading reading) {
                  values[reading.quantity() == Quantity.PRESSURE ? 0 : 1] = reading.value();
                }
              });
      assertTrue(Double.isFinite(values[0]) && values[1] > 270 && values[0] > -BAR);
      rows.add(values);
    }
    return rows;
  }
}

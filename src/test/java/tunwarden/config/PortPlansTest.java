package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.serial.PairGate;
import tunwarden.serial.PortPlan;
import tunwarden.units.BadInputException;
import tunwarden.wire.profile.Binding;

/** What a cellar file says of its instruments, as it reaches the ports. */
class PortPlansTest {
  private static final String VESSEL =
      """
      [vessel.FV2]
      volume = "2000 L"
      fill = "1800 L"
      liquid = { kind = "beer" }
      limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
      [vessel.FV2.readings]
      """;

  private static List<PortPlan> plans(String readings) {
    return PortPlans.of(Cellars.parse(VESSEL + readings));
  }

  @Test
  void calibrationAccuracyAndASecondGaugeReachThePorts() {
    List<PortPlan> plans =
        plans(
            """
            pressure = { device = "text-line", port = "A", field = "P", accuracy = "5 mbar", calibration = "0.02 bar = 0 bar, 2.05 bar = 2 bar" }
            pressure-check = { device = "text-line", port = "B", field = "P" }
            temperature = { device = "text-line", port = "A", field = "T" }
            """);
    assertEquals(2, plans.size());
    Binding pressure = plans.get(0).bindings().get(0);
    assertEquals(200_000, pressure.trim().calibration().apply(205_000), 1e-6);
    assertEquals(0, pressure.trim().calibration().apply(2_000), 1e-6);
    assertEquals(500, pressure.trim().u95Si(), 1e-9);
    Binding check = plans.get(1).bindings().get(0);
    assertEquals("FV2" + PairGate.CHECK, check.vessel());
    assertEquals(1000, check.trim().u95Si(), 1e-9, "as the profile says");
  }

  private static String refused(String pressure) {
    return assertThrows(
            BadInputException.class,
            () ->
                plans(
                    "pressure = "
                        + pressure
                        + "\ntemperature = { device = \"text-line\", port = \"A\", field = \"T\" }\n"))
        .getMessage();
  }

  @Test
  void whatCannotWorkIsRefusedBeforeAnyPortIsOpened() {
    String table = "{ device = \"%s\", port = \"A\", field = \"%s\"%s }";
    assertTrue(
        refused(String.format(table, "text-line", "P", ", calibration = \"1 bar = 2 bar\""))
            .contains("write shown = true twice"));
    assertTrue(
        refused(
                String.format(
                    table, "text-line", "P", ", calibration = \"1 bar = 2 bar, 1 bar = 3 bar\""))
            .contains("two points that differ"));
    assertTrue(refused(String.format(table, "text-line", "Q", "")).contains("it has P, T, B"));
    assertTrue(refused(String.format(table, "text-line", "T", "")).contains("not a pressure"));
    assertTrue(
        refused(String.format(table, "modbus-rtu-float", "pressure", "")).contains("1 to 247"));
    assertTrue(
        refused(String.format(table, "modbus-rtu-float", "pressure", ", address = 3"))
            .contains("must speak alike"));
  }
}

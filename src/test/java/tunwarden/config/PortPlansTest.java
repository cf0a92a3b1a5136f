package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.serial.PortPlan;
import tunwarden.units.BadInputException;

class PortPlansTest {
  private static final String VESSEL =
      """
      [vessel.FV1]
      volume = "2000 L"
      fill = "1800 L"
      liquid = { kind = "beer" }
      limits = { relief = "1.5 bar" }
      [vessel.FV1.readings]
      pressure = { device = "text-line", port = "%s", field = "%s" }
      temperature = { device = "text-line", port = "/dev/ttyUSB0", field = "T", baud = %d }
      """;

  private static List<PortPlan> plans(String port, String field, int baud) {
    String text = VESSEL.formatted(port, field, baud);
    return PortPlans.of(CellarFile.parse(Path.of("cellar.toml"), text));
  }

  @Test
  void instrumentsOnOnePortAreReadTogether() {
    List<PortPlan> plans = plans("/dev/ttyUSB0", "P", 9600);
    assertEquals(1, plans.size());
    assertEquals(2, plans.get(0).bindings().size());
    assertEquals(9600, plans.get(0).line().baud());
  }

  @Test
  void eachPortHasAPlanOfItsOwnAtItsOwnSpeed() {
    List<PortPlan> plans = plans("/dev/ttyUSB1", "P", 19200);
    assertEquals(2, plans.size());
    assertEquals(19200, plans.get(1).line().baud());
  }

  @Test
  void anUnknownFieldIsNamedWithThoseThereAre() {
    BadInputException e =
        assertThrows(BadInputException.class, () -> plans("/dev/ttyUSB0", "Q", 9600));
    assertEquals(
        "cellar.toml, vessel.FV1.readings.pressure: device 'text-line' has no field 'Q'; it has"
            + " P, T, B",
        e.getMessage());
  }

  @Test
  void twoSpeedsOnOnePortAreRefused() {
    assertThrows(BadInputException.class, () -> plans("/dev/ttyUSB0", "P", 19200));
  }
}

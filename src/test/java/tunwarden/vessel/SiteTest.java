package tunwarden.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.units.BadInputException;

class SiteTest {
  /** ISO 2533:1975, values computed from the standard's formula in relief-and-release.md. */
  @ParameterizedTest
  @CsvSource({
    "0,101325",
    "500,95460.8",
    "1000,89874.6",
    "2000,79495.2",
    "3000,70108.5",
    "4000,61640.2",
    "5000,54019.9"
  })
  void standardAtmosphereValidation(double altitudeM, double pa) {
    assertEquals(pa, Site.atAltitude(altitudeM).ambientPaAbsolute(), 0.05);
  }

  @Test
  void anAltitudeNobodyCellarsAtIsRefused() {
    assertThrows(BadInputException.class, () -> Site.atAltitude(9000));
    assertThrows(BadInputException.class, () -> Site.atAltitude(Double.NaN));
  }
}

package tunwarden.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantitiesTest {
  @ParameterizedTest
  @CsvSource({
    "4 C, TEMPERATURE, 277.15",
    "39.2F, TEMPERATURE, 277.15",
    "900 L, VOLUME, 0.9",
    "9 hL, VOLUME, 0.9",
    "0.9 m3, VOLUME, 0.9",
    "2.6 vol, GAS_CONTENT, 5.139706",
    "5.1 g/L, GAS_CONTENT, 5.1",
    "12 P, EXTRACT, 12",
    "5 %, FRACTION, 0.05",
    "15 mm, LENGTH, 0.015",
    "2 /h, RATE, 0.000555555555",
    "4 h, DURATION, 14400",
    "0.5mol/L, MOLARITY, 500"
  })
  void readsWhatTheInterfacePageShows(String text, Kind kind, double si) {
    assertEquals(si, Quantities.parse(text, kind), 1e-9);
  }

  /** 1.04838 is 12 °P by two formulas recalled from memory that agree to 0.003 °P. */
  @Test
  void aGravityIsTurnedIntoExtract() {
    assertEquals(12, Quantities.parse("1.04838 SG", Kind.EXTRACT), 0.01);
  }

  @ParameterizedTest
  @CsvSource({
    "1.0 bar, 200000",
    "1.0barg, 200000",
    "2.0 bara, 200000",
    "100 kPa, 200000",
    "1000 mbar, 200000",
    "14.503773773 psi, 200000"
  })
  void gaugeAndAbsoluteAreToldApart(String text, double absolute) {
    assertEquals(absolute, Pressure.parse(text).absolutePa(1e5), 1e-3);
    assertEquals(absolute - 1e5, Pressure.parse(text).gaugePa(1e5), 1e-3);
  }

  @Test
  void aBareNumberIsRefusedNamingTheUnits() {
    BadQuantityException e =
        assertThrows(BadQuantityException.class, () -> Quantities.parse("4", Kind.TEMPERATURE));
    assertEquals("'4' has no unit; for a temperature use one of C, F, K", e.getMessage());
  }

  @Test
  void aUnitOfAnotherKindIsRefused() {
    BadQuantityException e = assertThrows(BadQuantityException.class, () -> Pressure.parse("4 C"));
    assertEquals(
        "'4 C' has the unit 'C'; for a pressure use one of Pa, bar, mbar, kPa, MPa, psi, atm",
        e.getMessage());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "bar", "1,5 bar", "NaN bar", "1e999 bar", "1 2 bar", "--1 bar"})
  void whatIsNoNumberIsRefused(String text) {
    assertThrows(BadQuantityException.class, () -> Pressure.parse(text));
  }

  @Test
  void outputDoesNotFollowTheLocale() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertEquals("0.88 bar g", Display.METRIC.gauge(88_000));
      assertEquals("12.8 psi g", Display.US.gauge(88_000));
      assertEquals("4.2 °C", Display.METRIC.temperature(277.35));
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void nothingIsEverMinusZeroOrNotANumber() {
    assertEquals("0.00", Display.number(-0.001, 2));
    assertEquals("+0.00", Display.METRIC.signedPressureNumber(-10));
    assertEquals("-0.01", Display.METRIC.signedPressureNumber(-1000));
    assertEquals("?", Display.number(Double.NaN, 2));
  }

  @Test
  void theUnitsGoRound() {
    assertEquals(Display.METRIC, Display.METRIC.next().next().next());
  }
}

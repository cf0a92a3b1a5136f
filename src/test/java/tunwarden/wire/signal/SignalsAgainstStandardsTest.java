package tunwarden.wire.signal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.forecast.ReferenceRows;
import tunwarden.reading.Quality;

/**
 * Validation against published values. Pt100: {@code pt100_check.csv}, of which −50, −20, 20, 50,
 * 100 and 200 °C were seen in public sources and the rest computed from the IEC 60751 coefficients.
 * NAMUR NE 43: {@code ne43_currents.csv}, limits seen in public copies, the gaps computed. CRC:
 * {@code modbus_crc.csv}, each row with its own mark.
 */
class SignalsAgainstStandardsTest {
  @Test
  void platinumResistanceBothWays() {
    ResistanceThermometer element = new ResistanceThermometer(100);
    for (NamedCsvRecord row : ReferenceRows.of("pt100_check")) {
      double kelvin = ReferenceRows.number(row, "T_degC") + 273.15;
      double ohm = ReferenceRows.number(row, "R_ohm");
      assertEquals(ohm, element.fromSi(kelvin), 6e-5);
      assertEquals(kelvin, element.toSi(ohm).si(), 3e-4);
    }
  }

  @Test
  void resistanceInvertsOverTheWholeRangeOfTheStandard() {
    ResistanceThermometer element = new ResistanceThermometer(1000);
    for (double kelvin = 73.2; kelvin < 1123; kelvin += 1.7) {
      assertEquals(kelvin, element.toSi(element.fromSi(kelvin)).si(), 1e-7);
    }
  }

  @ParameterizedTest
  @CsvSource({"0", "18.4", "391", "1e9", "-100", "NaN", "Infinity"})
  void aBrokenWireOrAShortIsAFault(double ohm) {
    assertEquals(Quality.LOOP_FAULT, new ResistanceThermometer(100).toSi(ohm).quality());
  }

  @ParameterizedTest
  @CsvSource({
    "3.6, false", "3.61, false", "3.79, false", "3.8, true", "4.0, true", "20.0, true",
    "20.5, true", "20.51, false", "20.99, false", "21.0, false", "0, false", "NaN, false"
  })
  void onlyTheMeasuringRangeOfNe43IsAValue(double milliampere, boolean measured) {
    Decoded decoded = new CurrentLoop(0, 400_000).toSi(milliampere);
    assertEquals(measured, !decoded.isBad());
    if (measured) {
      assertEquals((milliampere - 4) / 16 * 400_000, decoded.si(), 1e-9);
    } else {
      assertEquals(Quality.LOOP_FAULT, decoded.quality());
    }
  }

  @Test
  void publishedChecksums() {
    for (NamedCsvRecord row : ReferenceRows.of("modbus_crc")) {
      byte[] message = bytes(row.getField("message_hex_without_crc"));
      int crc = Integer.decode(row.getField("crc16"));
      assertEquals(crc, Crc16.of(message, 0, message.length), row::toString);
      byte[] wire = bytes(row.getField("wire_bytes_low_first"));
      assertEquals(crc, (wire[0] & 0xFF) | (wire[1] & 0xFF) << 8);
    }
  }

  private static byte[] bytes(String hex) {
    String[] pairs = hex.split(" ");
    byte[] bytes = new byte[pairs.length];
    for (int i = 0; i < pairs.length; i++) {
      bytes[i] = (byte) Integer.parseInt(pairs[i], 16);
    }
    return bytes;
  }

  @Test
  void calibrationPassesThroughItsPointsAndBack() {
    Calibration calibration = new Calibration(2_000, 0, 205_000, 200_000);
    assertEquals(0, calibration.apply(2_000), 1e-9);
    assertEquals(200_000, calibration.apply(205_000), 1e-9);
    assertEquals(123_456, calibration.undo(calibration.apply(123_456)), 1e-6);
    assertEquals(7, Calibration.NONE.apply(7));
    assertTrue(
        org.junit.jupiter.api.Assertions.assertThrows(
                IllegalArgumentException.class, () -> new Calibration(1, 0, 1, 5))
            .getMessage()
            .contains("two points"));
  }
}

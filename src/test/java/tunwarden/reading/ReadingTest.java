package tunwarden.reading;

import static org.junit.jupiter.api.Assertions.assertThrows;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ReadingTest {
  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
  void whatIsNotFiniteIsNoReading(double value) {
    assertThrows(
        IllegalArgumentException.class,
        () -> Reading.good(Instant.EPOCH, "K1", Quantity.PRESSURE, value));
  }

  @Test
  void aFaultCannotSayThatAllIsWell() {
    assertThrows(
        IllegalArgumentException.class,
        () -> new Fault(Instant.EPOCH, "K1", Quantity.PRESSURE, Quality.GOOD, ""));
  }
}

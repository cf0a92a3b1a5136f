package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import tunwarden.config.profile.Profiles;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.signal.Calibration;

/** Two gauges on one vessel: 10 mbar each, so 14.1 mbar together. */
class PairGateTest {
  private static final Profile PROFILE = Profiles.find("text-line", Path.of(""));
  private static final Instant START = Instant.EPOCH;
  private final List<Sample> passed = new ArrayList<>();
  private final Consumer<Sample> gate =
      PairGate.over(List.of(plan("FV2"), plan("FV2" + PairGate.CHECK)), passed::add);

  private static PortPlan plan(String vessel) {
    Binding.Trim trim = new Binding.Trim(Calibration.NONE, 0, Duration.ofSeconds(1), 1000);
    Binding binding =
        new Binding(vessel, Quantity.PRESSURE, PROFILE, PROFILE.field("P").orElseThrow(), 0, trim);
    return new PortPlan("port of " + vessel, List.of(binding));
  }

  private Quality after(int second, double mainPa, double checkPa) {
    Instant time = START.plusSeconds(second);
    gate.accept(Reading.good(time, "FV2" + PairGate.CHECK, Quantity.PRESSURE, checkPa));
    gate.accept(Reading.good(time, "FV2", Quantity.PRESSURE, mainPa));
    return ((Reading) passed.get(passed.size() - 1)).quality();
  }

  @Test
  void aLastingDifferenceBeyondBothAccuraciesIsMarked() {
    assertEquals(Quality.GOOD, after(0, 100_000, 101_400));
    assertEquals(Quality.GOOD, after(1, 100_000, 101_500));
    assertEquals(Quality.GOOD, after(2, 100_000, 101_500));
    assertEquals(Quality.DISAGREES, after(3, 100_000, 101_500));
    assertEquals(Quality.DISAGREES, after(4, 100_000, 90_000));
    assertEquals(Quality.GOOD, after(5, 100_000, 100_000));
    assertEquals(6, passed.size(), "the second instrument is not passed on");
  }

  @Test
  void aSecondInstrumentThatFellSilentQuarrelsWithNobody() {
    for (int i = 0; i < 5; i++) {
      after(i, 100_000, 120_000);
    }
    Reading later = Reading.good(START.plusSeconds(30), "FV2", Quantity.PRESSURE, 100_000);
    gate.accept(later);
    assertSame(later, passed.get(passed.size() - 1));
  }

  @Test
  void withoutAPairNothingStandsInBetween() {
    Consumer<Sample> next = sample -> {};
    assertSame(next, PairGate.over(List.of(plan("FV2")), next));
  }
}

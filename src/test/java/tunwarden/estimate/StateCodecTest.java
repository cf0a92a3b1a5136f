package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.simulate.Row;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;

class StateCodecTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final int LIMIT_BYTES = 64 * 1024;

  private final Estimator estimator = new BankEstimator();

  private State feed(State from, Row row) {
    Instant at = START.plusMillis(Math.round(row.seconds() * 1000));
    State warm =
        estimator.step(from, Reading.good(at, "T1", Quantity.TEMPERATURE, row.kelvin())).next();
    return estimator.step(warm, Reading.good(at, "T1", Quantity.PRESSURE, row.paGauge())).next();
  }

  @Test
  void comingBackAtAnyMomentChangesNoDigitOfWhatFollows() {
    Simulation log = Scenario.VENTED.run(3);
    List<Row> rows = log.rows().subList(0, 700);
    State through = estimator.begin(log.vessel());
    State resumed = through;
    for (int i = 0; i < rows.size(); i++) {
      through = feed(through, rows.get(i));
      resumed = feed(resumed, rows.get(i));
      if (i % 37 == 0) {
        byte[] kept = StateCodec.encode(resumed);
        assertTrue(kept.length <= LIMIT_BYTES, kept.length + " bytes");
        resumed = StateCodec.decode(log.vessel(), kept);
      }
      assertEquals(through.estimate(), resumed.estimate());
    }
    assertArrayEquals(StateCodec.encode(through), StateCodec.encode(resumed));
  }

  @Test
  void damageAndAStrangersStateAreRefusedInOneSentence() {
    Simulation log = Scenario.KEG.run(1);
    State state = estimator.begin(log.vessel());
    List<String> sentences = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      state = feed(state, log.rows().get(i));
    }
    byte[] kept = StateCodec.encode(state);
    byte[] damaged = kept.clone();
    damaged[kept.length / 2] ^= 1;
    sentences.add(refusal(log, damaged));
    sentences.add(refusal(log, new byte[10]));
    Simulation other = Scenario.SETTLED.run(1);
    sentences.add(refusal(other, kept));
    assertTrue(sentences.get(0).contains("damaged"), sentences.get(0));
    assertTrue(sentences.get(2).contains("described otherwise"), sentences.get(2));
  }

  private static String refusal(Simulation log, byte[] bytes) {
    return assertThrows(
            IllegalArgumentException.class, () -> StateCodec.decode(log.vessel(), bytes))
        .getMessage();
  }
}

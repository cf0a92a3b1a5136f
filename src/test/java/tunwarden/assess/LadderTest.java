package tunwarden.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.forecast.Outlook;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;

/**
 * The levels about a setting of 1 bar g: ISO 4126-1 may open at 0.90 and reseats at 0.70 at the
 * latest, 10 % or 0.1 bar over at full flow; ASME VIII-1 may open at 0.862 (2 psi), 3 psi over at
 * full flow; operating ceiling 0.655 by the greater of 10 % or 5 psi (from memory, Appendix M).
 */
class LadderTest {
  private static List<Rung> rungs(ReliefSetting setting) {
    return Ladder.of(
        new Limits(Optional.of(setting), OptionalDouble.of(2e5), OptionalDouble.of(-2000)),
        Observed.NEVER,
        Outlook.NONE);
  }

  private static Rung rung(List<Rung> rungs, Rung.Kind kind) {
    return rungs.stream().filter(r -> r.kind() == kind).findFirst().orElseThrow();
  }

  @Test
  void everyLevelOfASettingIsARungOfItsOwnHighestFirst() {
    List<Rung> rungs = rungs(ReliefSetting.iso4126(1e5));
    assertEquals(0.9e5, rung(rungs, Rung.Kind.EARLIEST_LIFT).paGauge(), 1);
    assertEquals("earliest lift, ISO", rung(rungs, Rung.Kind.EARLIEST_LIFT).label());
    assertEquals(65_526, rung(rungs, Rung.Kind.OPERATING_CEILING).paGauge(), 1);
    assertEquals(0.7e5, rung(rungs, Rung.Kind.RESEAT).paGauge(), 1);
    assertEquals(1.1e5, rung(rungs, Rung.Kind.ACCUMULATION).paGauge(), 1);
    for (int i = 1; i < rungs.size(); i++) {
      assertTrue(rungs.get(i - 1).paGauge() >= rungs.get(i).paGauge());
    }
  }

  @Test
  void theStandardOfTheToleranceIsNamedAndAStatedOneIsNot() {
    List<Rung> asme = rungs(ReliefSetting.asme(1e5));
    assertEquals("earliest lift, ASME", rung(asme, Rung.Kind.EARLIEST_LIFT).label());
    assertEquals(86_210, rung(asme, Rung.Kind.EARLIEST_LIFT).paGauge(), 1);
    assertEquals(120_684, rung(asme, Rung.Kind.ACCUMULATION).paGauge(), 1);
    List<Rung> stated = rungs(ReliefSetting.stated(1e5, 0.05e5));
    assertEquals("earliest lift", rung(stated, Rung.Kind.EARLIEST_LIFT).label());
  }
}

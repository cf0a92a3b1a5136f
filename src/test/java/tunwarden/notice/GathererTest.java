package tunwarden.notice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static tunwarden.notice.Notices.NOON;

import java.time.Duration;
import java.time.Instant;
import org.junit.jupiter.api.Test;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.Priority;

/** When word is sent and what is folded together. */
class GathererTest {
  private final Gatherer gatherer =
      new Gatherer(new NoticeRules(Priority.CAUTION, Duration.ofSeconds(5), 3));

  private static Instant at(long seconds) {
    return NOON.plusSeconds(seconds);
  }

  @Test
  void alarmsThatComeTogetherGoInOneMessage() {
    gatherer.add(Notices.silent("FV1", 1), at(0));
    gatherer.add(Notices.silent("FV2", 2), at(3));
    assertTrue(gatherer.due(at(4)).isEmpty());
    Message message = gatherer.due(at(5)).orElseThrow();
    assertEquals("Tunwarden: 2 alarms, first FV1: instrument silent", message.subject());
    assertTrue(message.text().contains("Check plug, cable and supply"));
    assertEquals(2, message.alarms().size());
    assertTrue(gatherer.due(at(6)).isEmpty());
  }

  @Test
  void aboveTheHourlyNumberAlarmsWaitAndNoneIsForgotten() {
    int sent = 0;
    for (int minute = 0; minute < 59; minute++) {
      gatherer.add(Notices.silent("FV" + minute, minute), at(60L * minute));
      sent += gatherer.due(at(60L * minute + 10)).isPresent() ? 1 : 0;
    }
    assertEquals(3, sent);
    Message rest = gatherer.due(at(3700)).orElseThrow();
    assertEquals("Tunwarden: 56 alarms, first FV3: instrument silent", rest.subject());
    assertTrue(rest.text().endsWith("... and 6 more; see the journal."));
  }

  @Test
  void onlyNewsThatNeedsAPersonIsSent() {
    gatherer.add(Notices.station(AlarmKind.CLOCK, false, 1), at(0));
    gatherer.add(Notices.station(AlarmKind.NOTICE, true, 2), at(0));
    assertTrue(gatherer.flush(at(10)).isEmpty());
    gatherer.add(Notices.station(AlarmKind.DISK, true, 3), at(10));
    assertTrue(gatherer.flush(at(20)).isPresent());
  }

  @Test
  void aClockSetBackHoldsUpNothing() {
    for (int i = 0; i < 3; i++) {
      gatherer.add(Notices.silent("FV" + i, i), at(3600 + i));
      assertTrue(gatherer.due(at(3610 + i)).isPresent());
    }
    gatherer.add(Notices.silent("FV9", 9), at(0));
    assertTrue(gatherer.due(at(5)).isPresent());
  }
}

package tunwarden.replay.text;

import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.zone.ZoneOffsetTransition;

/**
 * A written date and time of day. With an offset in the text that offset holds; without one the
 * zone given at construction does. Where clocks are set back an hour comes twice: the first pass
 * holds until the times jump back.
 */
public final class CalendarTime implements TimeReader {
  /** Around the year 9999; anything later is a misread number. */
  static final double LATEST_US = 253_402_300_799e6;

  private static final long SECOND_US = 1_000_000L;
  private static final long SECOND_PASS_US = 300 * SECOND_US;
  private static final long OFFSET_BLOCK_S = 900;

  private final DateText text;
  private final ZoneId zone;
  private ZoneOffset offset;
  private ZoneOffset blockOffset;
  private long block = Long.MIN_VALUE;
  private long previousUs = Long.MIN_VALUE;
  private long skipped;

  /**
   * A reader for one log.
   *
   * @param order how dates are written
   * @param zone where times without an offset were written
   */
  public CalendarTime(DateOrder order, ZoneId zone) {
    this.text = new DateText(order);
    this.zone = zone;
    this.offset = ZoneOffset.UTC;
  }

  @Override
  public long read(char[] chars, int from, int to) {
    if (!text.read(chars, from, to)) {
      return UNREADABLE;
    }
    long localS = text.localSecond();
    long us;
    if (text.hasOffset()) {
      if (offset.getTotalSeconds() != text.offsetS()) {
        offset = ZoneOffset.ofTotalSeconds(text.offsetS());
      }
      us = (localS - text.offsetS()) * SECOND_US;
    } else {
      offset = offsetAt(localS);
      us = (localS - offset.getTotalSeconds()) * SECOND_US;
    }
    us += text.micros();
    previousUs = us;
    return us;
  }

  /** Zone rules only change at whole quarters of an hour, so one look-up serves a block. */
  private ZoneOffset offsetAt(long localS) {
    long now = Math.floorDiv(localS, OFFSET_BLOCK_S);
    if (now == block && blockOffset != null) {
      return blockOffset;
    }
    LocalDateTime local = LocalDateTime.ofEpochSecond(localS, 0, ZoneOffset.UTC);
    ZoneOffsetTransition change = zone.getRules().getTransition(local);
    block = now;
    blockOffset = null;
    if (change == null) {
      blockOffset = zone.getRules().getOffset(local);
      return blockOffset;
    }
    if (change.isGap()) {
      skipped++;
      return change.getOffsetBefore();
    }
    long firstPassUs = (localS - change.getOffsetBefore().getTotalSeconds()) * SECOND_US;
    boolean second = previousUs != Long.MIN_VALUE && firstPassUs < previousUs - SECOND_PASS_US;
    return second ? change.getOffsetAfter() : change.getOffsetBefore();
  }

  @Override
  public ZoneOffset offset() {
    return offset;
  }

  @Override
  public long skippedHours() {
    return skipped;
  }
}

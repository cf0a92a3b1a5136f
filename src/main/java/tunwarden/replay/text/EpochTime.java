package tunwarden.replay.text;

import java.time.ZoneOffset;

/** A count of time units since 1970-01-01T00:00Z, or of days since 1899-12-30 as sheets count. */
public final class EpochTime implements TimeReader {
  private static final double DAY_US = 86_400e6;
  private static final double SHEET_DAY_ZERO = 25_569;

  /** Days are stored with some ten decimals; a thousandth of a second is what survives. */
  private static final long SHEET_ROUND_US = 1000;

  private final double unitUs;
  private final double zero;
  private final char decimal;
  private final long roundUs;

  private EpochTime(double unitUs, double zero, char decimal) {
    this.unitUs = unitUs;
    this.zero = zero;
    this.decimal = decimal;
    this.roundUs = unitUs == DAY_US ? SHEET_ROUND_US : 1;
  }

  /** Seconds since 1970, with or without decimals. */
  public static EpochTime seconds(char decimal) {
    return new EpochTime(1e6, 0, decimal);
  }

  /** Milliseconds since 1970. */
  public static EpochTime milliseconds(char decimal) {
    return new EpochTime(1e3, 0, decimal);
  }

  /** Microseconds since 1970. */
  public static EpochTime microseconds(char decimal) {
    return new EpochTime(1, 0, decimal);
  }

  /** Days of a spreadsheet (day 25,569 is 1970-01-01), taken as UTC. */
  public static EpochTime sheetDays(char decimal) {
    return new EpochTime(DAY_US, SHEET_DAY_ZERO, decimal);
  }

  @Override
  public long read(char[] chars, int from, int to) {
    double count = Numbers.parse(chars, from, to, decimal);
    double us = (count - zero) * unitUs;
    return Math.abs(us) <= CalendarTime.LATEST_US ? Math.round(us / roundUs) * roundUs : UNREADABLE;
  }

  @Override
  public ZoneOffset offset() {
    return ZoneOffset.UTC;
  }
}

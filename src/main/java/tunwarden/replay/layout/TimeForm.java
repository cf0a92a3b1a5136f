package tunwarden.replay.layout;

import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import tunwarden.replay.text.CalendarTime;
import tunwarden.replay.text.DateOrder;
import tunwarden.replay.text.EpochTime;
import tunwarden.replay.text.TimeReader;

/**
 * How times are written.
 *
 * @param order order of a written date; empty for a count
 * @param count the unit of a count since 1970: {@code s}, {@code ms}, {@code us}, {@code days}
 * @param zone where times without an offset were written
 * @param decimal the decimal sign of a count
 */
public record TimeForm(Optional<DateOrder> order, String count, ZoneId zone, char decimal) {
  /** Units of a count, as {@code --columns time=NAME/s} states them. */
  static final List<String> COUNTS = List.of("s", "ms", "us", "days");

  /** A written date. */
  public static TimeForm calendar(DateOrder order, ZoneId zone) {
    return new TimeForm(Optional.of(order), "", zone, '.');
  }

  /** A count. */
  public static TimeForm count(String unit, ZoneId zone, char decimal) {
    return new TimeForm(Optional.empty(), unit, zone, decimal);
  }

  /** A fresh reader for one pass over the log. */
  public TimeReader open() {
    if (order.isPresent()) {
      return new CalendarTime(order.get(), zone);
    }
    return switch (count) {
      case "ms" -> EpochTime.milliseconds(decimal);
      case "us" -> EpochTime.microseconds(decimal);
      case "days" -> EpochTime.sheetDays(decimal);
      default -> EpochTime.seconds(decimal);
    };
  }

  /** For sentences. */
  public String words() {
    if (order.isPresent()) {
      return "written as " + order.get().words();
    }
    return switch (count) {
      case "ms" -> "milliseconds since 1970";
      case "us" -> "microseconds since 1970";
      case "days" -> "days since 1899-12-30";
      default -> "seconds since 1970";
    };
  }
}

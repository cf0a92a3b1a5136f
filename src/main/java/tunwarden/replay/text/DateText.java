package tunwarden.replay.text;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.util.Locale;

/**
 * Takes a written date and time of day apart: ISO 8601 and the ways loggers write, in one pass over
 * the characters. One object serves one log and remembers the last date, which rarely changes.
 */
final class DateText {
  private static final String MONTHS = "janfebmaraprmayjunjulaugsepoctnovdec";
  private static final int DAY_S = 86_400;

  private final DateOrder order;
  private char[] chars;
  private int at;
  private int to;
  private int digits;

  private int lastDateKey = -1;
  private long lastDay;
  private long localS;
  private int micros;
  private int offsetS;
  private boolean offsetSeen;

  DateText(DateOrder order) {
    this.order = order;
  }

  /** Seconds of the written date and time since 1970-01-01T00:00 of the same clock. */
  long localSecond() {
    return localS;
  }

  int micros() {
    return micros;
  }

  boolean hasOffset() {
    return offsetSeen;
  }

  int offsetS() {
    return offsetS;
  }

  /** Whether the stretch is a date, with or without a time of day. */
  boolean read(char[] source, int from, int stop) {
    chars = source;
    at = from;
    to = stop;
    micros = 0;
    offsetS = 0;
    offsetSeen = false;
    if (!readDate()) {
      return false;
    }
    localS = lastDay * DAY_S;
    if (at == to) {
      return true;
    }
    boolean blank = chars[at] == ' ' || chars[at] == ',';
    if (!blank && chars[at] != 'T' && chars[at] != 't' && chars[at] != '_') {
      return false;
    }
    at++;
    skipBlanks();
    return readClock() && readOffset() && at == to;
  }

  private boolean readDate() {
    int first = number(4);
    int firstDigits = digits;
    if (first < 0 || at >= to) {
      return false;
    }
    if (firstDigits == 4 && isDigit(chars[at])) {
      return date(first, number(2), number(2));
    }
    char separator = chars[at++];
    if ("-/. ".indexOf(separator) < 0) {
      return false;
    }
    int second = at < to && Character.isLetter(chars[at]) ? monthName() : number(4);
    boolean monthInMiddle = digits == 0;
    if (second < 0 || at >= to || chars[at++] != separator) {
      return false;
    }
    int third = number(4);
    if (third < 0) {
      return false;
    }
    DateOrder used =
        monthInMiddle && order != DateOrder.YEAR_MONTH_DAY ? DateOrder.DAY_MONTH_YEAR : order;
    return switch (used) {
      case YEAR_MONTH_DAY -> firstDigits == 4 && date(first, second, third);
      case DAY_MONTH_YEAR -> date(year(third), second, first);
      case MONTH_DAY_YEAR -> date(year(third), first, second);
    };
  }

  /** Two digits mean this century; three or one are no year. */
  private int year(int written) {
    if (digits == 2) {
      return 2000 + written;
    }
    return digits == 4 ? written : -1;
  }

  private boolean date(int year, int month, int day) {
    if (year < 1970 || month < 1 || month > 12 || day < 1 || day > 31) {
      return false;
    }
    int key = (year * 12 + month) * 32 + day;
    if (key == lastDateKey) {
      return true;
    }
    try {
      lastDay = LocalDate.of(year, month, day).toEpochDay();
      lastDateKey = key;
      return true;
    } catch (DateTimeException noSuchDay) {
      return false;
    }
  }

  private boolean readClock() {
    int hour = number(2);
    if (hour < 0 || at >= to) {
      return false;
    }
    boolean compact = isDigit(chars[at]);
    if (!compact && chars[at] != ':' && chars[at] != '.') {
      return false;
    }
    at += compact ? 0 : 1;
    int minute = number(2);
    int second = 0;
    if (compact && at < to && isDigit(chars[at])) {
      second = number(2);
      readFraction();
    } else if (minute >= 0 && at < to && (chars[at] == ':' || chars[at] == '.')) {
      at++;
      second = number(4);
      readFraction();
    }
    hour = twelveHour(hour);
    if (hour < 0 || hour > 23 || minute < 0 || minute > 59 || second < 0 || second > 60) {
      return false;
    }
    localS += hour * 3600L + minute * 60L + second;
    return true;
  }

  private void readFraction() {
    if (at < to && (chars[at] == '.' || chars[at] == ',')) {
      at++;
      int scale = 100_000;
      while (at < to && isDigit(chars[at])) {
        micros += scale * (chars[at++] - '0');
        scale /= 10;
      }
    }
  }

  /** The hour with a following AM or PM taken in; -1 when that makes no hour. */
  private int twelveHour(int hour) {
    int mark = at;
    while (mark < to && chars[mark] == ' ') {
      mark++;
    }
    if (mark + 2 > to) {
      return hour;
    }
    String half = new String(chars, mark, 2).toUpperCase(Locale.ROOT);
    if (!half.equals("AM") && !half.equals("PM")) {
      return hour;
    }
    at = mark + 2;
    if (hour < 1 || hour > 12) {
      return -1;
    }
    return hour % 12 + (half.equals("PM") ? 12 : 0);
  }

  private boolean readOffset() {
    skipBlanks();
    if (at == to) {
      return true;
    }
    char sign = chars[at];
    if (sign == 'Z' || sign == 'z') {
      at++;
      offsetSeen = true;
      return true;
    }
    String rest = new String(chars, at, to - at);
    if (rest.equals("UTC") || rest.equals("GMT")) {
      at = to;
      offsetSeen = true;
      return true;
    }
    if (sign != '+' && sign != '-') {
      return false;
    }
    at++;
    int hours = number(4);
    int minutes = 0;
    if (digits == 4) {
      minutes = hours % 100;
      hours /= 100;
    } else if (at < to && chars[at] == ':') {
      at++;
      minutes = number(4);
    }
    if (hours < 0 || hours > 18 || minutes < 0 || minutes > 59 || hours * 60 + minutes > 1080) {
      return false;
    }
    offsetSeen = true;
    offsetS = (sign == '-' ? -60 : 60) * (hours * 60 + minutes);
    return true;
  }

  private int monthName() {
    int begin = at;
    while (at < to && Character.isLetter(chars[at])) {
      at++;
    }
    digits = 0;
    if (at - begin < 3) {
      return -1;
    }
    String name = new String(chars, begin, 3).toLowerCase(Locale.ROOT);
    int where = MONTHS.indexOf(name);
    return where >= 0 && where % 3 == 0 ? where / 3 + 1 : -1;
  }

  /** The digits from here on, at most that many; -1 when there are none. */
  private int number(int most) {
    int value = 0;
    int begin = at;
    while (at < to && isDigit(chars[at]) && at - begin < most) {
      value = value * 10 + (chars[at++] - '0');
    }
    digits = at - begin;
    return digits == 0 ? -1 : value;
  }

  private static boolean isDigit(char c) {
    return c >= '0' && c <= '9';
  }

  private void skipBlanks() {
    while (at < to && chars[at] == ' ') {
      at++;
    }
  }
}

package tunwarden.replay.text;

import java.util.Arrays;
import java.util.Optional;

/** In which order day, month and year are written. */
public enum DateOrder {
  YEAR_MONTH_DAY("ymd", "year-month-day"),
  DAY_MONTH_YEAR("dmy", "day, month, year"),
  MONTH_DAY_YEAR("mdy", "month, day, year");

  private final String word;
  private final String words;

  DateOrder(String word, String words) {
    this.word = word;
    this.words = words;
  }

  /** Spelling on the command line. */
  public String word() {
    return word;
  }

  /** For sentences. */
  public String words() {
    return words;
  }

  /** The order with that word, if there is one. */
  public static Optional<DateOrder> ofWord(String word) {
    return Arrays.stream(values()).filter(order -> order.word.equals(word)).findFirst();
  }
}

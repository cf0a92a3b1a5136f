package tunwarden.replay.layout;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import tunwarden.replay.text.CalendarTime;
import tunwarden.replay.text.DateOrder;
import tunwarden.replay.text.TimeReader;

/** How the times of a column are written, from a sample of its cells. */
final class TimeGuess {
  private static final double EPOCH_FROM_S = 9.4e8;
  private static final double EPOCH_TO_S = 4.2e9;

  private TimeGuess() {}

  /** Whether a cell is a date with or without a time of day, or a plausible epoch count. */
  static boolean looksLikeTime(String cell) {
    for (DateOrder order : DateOrder.values()) {
      if (reads(order, cell)) {
        return true;
      }
    }
    return epochUnit(List.of(cell), '.').isPresent();
  }

  /** Whether a cell is a time of day alone. */
  static boolean looksLikeClock(String cell) {
    return cell.matches("\\d{1,2}:\\d{2}(:\\d{2}([.,]\\d+)?)?( ?[AaPp][Mm])?");
  }

  static boolean reads(DateOrder order, String cell) {
    TimeReader reader = new CalendarTime(order, ZoneOffset.UTC);
    return reader.read(cell.toCharArray(), 0, cell.length()) != TimeReader.UNREADABLE;
  }

  /** The unit of an epoch count, by its size. */
  static Optional<String> epochUnit(List<String> cells, char decimal) {
    String found = "";
    for (String cell : cells) {
      double count = NumberGuess.value(cell, decimal);
      String unit = "";
      if (count > EPOCH_FROM_S && count < EPOCH_TO_S) {
        unit = "s";
      } else if (count > EPOCH_FROM_S * 1e3 && count < EPOCH_TO_S * 1e3) {
        unit = "ms";
      } else if (count > EPOCH_FROM_S * 1e6 && count < EPOCH_TO_S * 1e6) {
        unit = "us";
      }
      if (unit.isEmpty() || (!found.isEmpty() && !found.equals(unit))) {
        return Optional.empty();
      }
      found = unit;
    }
    return found.isEmpty() ? Optional.empty() : Optional.of(found);
  }

  /** Whether every cell carries its own offset. */
  static boolean hasOffset(List<String> cells) {
    return cells.stream()
        .allMatch(
            c -> c.matches(".*(Z|z|UTC|GMT|\\d[ ]?[+-]\\d{1,2}(:?\\d{2})?)$") && !dateOnly(c));
  }

  private static boolean dateOnly(String cell) {
    return cell.indexOf(':') < 0 && cell.indexOf('T') < 0;
  }

  /**
   * The form that reads nearly every cell.
   *
   * @param guesses takes a sentence when day and month could be either way round
   */
  static Optional<TimeForm> of(
      List<String> cells, ZoneId zone, char decimal, List<String> guesses) {
    Optional<String> epoch = epochUnit(cells, decimal);
    if (epoch.isPresent()) {
      return Optional.of(TimeForm.count(epoch.get(), zone, decimal));
    }
    DateOrder best = null;
    long bestCount = 0;
    boolean tie = false;
    for (DateOrder order : DateOrder.values()) {
      long count = cells.stream().filter(cell -> reads(order, cell)).count();
      tie = count > 0 && count == bestCount || tie && count <= bestCount;
      if (count > bestCount) {
        best = order;
        bestCount = count;
      }
    }
    if (best == null || bestCount < 0.8 * cells.size()) {
      return Optional.empty();
    }
    boolean letters = cells.get(0).chars().limit(8).anyMatch(Character::isLetter);
    if (tie && !letters) {
      best = settleTie(cells, guesses);
    }
    return Optional.of(TimeForm.calendar(best, zone));
  }

  /** Points are written between day, month and year; slashes could be either. */
  private static DateOrder settleTie(List<String> cells, List<String> guesses) {
    boolean points = cells.get(0).indexOf('.') == 2 || cells.get(0).indexOf('.') == 1;
    if (!points) {
      guesses.add(
          "dates were read as day, month, year; if they are month first, give"
              + " --columns time=NAME/mdy");
    }
    return DateOrder.DAY_MONTH_YEAR;
  }
}

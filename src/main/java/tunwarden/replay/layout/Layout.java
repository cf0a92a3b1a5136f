package tunwarden.replay.layout;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tunwarden.reading.Quantity;

/**
 * Everything needed to read the rows of one log.
 *
 * @param separator between fields
 * @param decimal decimal sign
 * @param time how times are written
 * @param columns the columns used, pressure last and barometer first
 * @param fields number of fields a whole row has
 * @param firstRow line of the first row of data, counted from 1
 * @param guesses what was guessed, one sentence each, with what overrides it
 */
public record Layout(
    char separator,
    char decimal,
    TimeForm time,
    List<Column> columns,
    int fields,
    long firstRow,
    List<String> guesses) {
  /** Puts the columns into the order in which samples are emitted. */
  public Layout {
    columns = columns.stream().sorted(Comparator.comparingInt(Layout::rank)).toList();
    guesses = List.copyOf(guesses);
  }

  private static int rank(Column column) {
    if (column.holds(Quantity.PRESSURE)) {
      return 3;
    }
    if (column.holds(Quantity.BAROMETER)) {
      return 0;
    }
    return column.role() == Column.Role.UNCERTAINTY ? 1 : 2;
  }

  /** The first column with that role. */
  public Optional<Column> column(Column.Role role) {
    return columns.stream().filter(column -> column.role() == role).findFirst();
  }

  /** The vessels that share each row; one empty name when rows speak of one vessel only. */
  public List<String> vesselsPerRow() {
    List<String> named =
        columns.stream()
            .filter(column -> column.role() == Column.Role.VALUE)
            .map(Column::vessel)
            .filter(vessel -> !vessel.isEmpty())
            .distinct()
            .toList();
    return named.isEmpty() ? List.of("") : named;
  }
}

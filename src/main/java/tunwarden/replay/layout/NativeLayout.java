package tunwarden.replay.layout;

import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.reading.Quantity;
import tunwarden.replay.text.DateOrder;

/** Our own log format, recognised by its column names; nothing in it is guessed. */
public final class NativeLayout {
  /** Column of the laboratory value's uncertainty. */
  public static final String DISSOLVED_U95 = "dissolved_u95_g_per_l";

  private NativeLayout() {}

  /**
   * The layout, if the header is ours: a {@code time} column and at least one of our quantities.
   */
  public static Optional<Layout> of(SampledLine header) {
    List<Column> columns = new ArrayList<>();
    List<String> unused = new ArrayList<>();
    String[] names = header.text().split(",", -1);
    for (int i = 0; i < names.length; i++) {
      Optional<Column> column = column(i, names[i].trim());
      if (column.isPresent()) {
        columns.add(column.get());
      } else {
        unused.add("'" + names[i].trim() + "'");
      }
    }
    boolean timed = columns.stream().anyMatch(c -> c.role() == Column.Role.TIME);
    boolean valued = columns.stream().anyMatch(c -> c.role() == Column.Role.VALUE);
    if (!timed || !valued) {
      return Optional.empty();
    }
    List<String> notes =
        unused.isEmpty() ? List.of() : List.of("not used: " + String.join(", ", unused));
    return Optional.of(
        new Layout(
            ',',
            '.',
            TimeForm.calendar(DateOrder.YEAR_MONTH_DAY, ZoneOffset.UTC),
            columns,
            names.length,
            header.number() + 1,
            notes));
  }

  private static Optional<Column> column(int index, String name) {
    switch (name) {
      case "time":
        return Optional.of(Column.of(index, name, Column.Role.TIME));
      case "vessel":
        return Optional.of(Column.of(index, name, Column.Role.VESSEL));
      case "event":
        return Optional.of(Column.of(index, name, Column.Role.EVENT));
      case DISSOLVED_U95:
        CellUnit unit = CellUnit.nativeOf(Quantity.DISSOLVED);
        return Optional.of(
            new Column(
                index,
                name,
                Column.Role.UNCERTAINTY,
                Optional.of(Quantity.DISSOLVED),
                Optional.of(unit),
                ""));
      default:
        for (Quantity quantity : Quantity.values()) {
          if (quantity.column().equals(name)) {
            return Optional.of(Column.value(index, name, quantity, CellUnit.nativeOf(quantity)));
          }
        }
        return Optional.empty();
    }
  }
}

package tunwarden.replay.layout;

import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tunwarden.reading.Quantity;
import tunwarden.replay.text.DateOrder;

/** Gives every column of a foreign table its meaning; what is guessed goes into the sentences. */
final class LayoutGuess {
  private final Table table;
  private final List<ColumnChoice> choices;
  private final Optional<ZoneId> zone;
  private final List<String> guesses;
  private final List<Column> columns = new ArrayList<>();
  private final Set<Integer> taken = new HashSet<>();
  private char decimal;
  private TimeForm form;

  LayoutGuess(
      Table table, List<ColumnChoice> choices, Optional<ZoneId> zone, List<String> guesses) {
    this.table = table;
    this.choices = choices;
    this.zone = zone;
    this.guesses = guesses;
  }

  Layout layout() throws LayoutException {
    decimal = decimalSign();
    sayShape();
    for (ColumnChoice choice : choices) {
      if (!choice.word().equals("time") && !choice.word().equals("clock")) {
        stated(choice);
      }
    }
    findTime();
    columns.addAll(new ValueGuess(table, decimal, guesses).find(columns, taken));
    findTexts();
    requirePressure();
    sayUnused();
    return new Layout(
        table.separator(), decimal, form, columns, table.width(), table.firstRow(), guesses);
  }

  private char decimalSign() {
    List<String> numbers = new ArrayList<>();
    for (int i = 0; i < table.width(); i++) {
      for (String cell : table.cells(i)) {
        if (NumberGuess.looksLikeNumber(cell)) {
          numbers.add(cell);
        }
      }
    }
    return NumberGuess.decimalSign(numbers);
  }

  private void sayShape() {
    if (table.separator() != ',' || decimal != '.') {
      guesses.add(
          "fields are separated by "
              + table.separatorInWords()
              + (decimal == ',' ? ", with decimal commas" : ""));
    }
    if (table.headerLine() == 0) {
      guesses.add(
          "no line of names was found, so columns go by number; state them with"
              + " --columns time=1,pressure=2/bar,temperature=3/C");
    }
  }

  private void stated(ColumnChoice choice) throws LayoutException {
    int index = choice.index(table);
    String name = table.names().get(index);
    taken.add(index);
    switch (choice.word()) {
      case "vessel" -> columns.add(Column.of(index, name, Column.Role.VESSEL));
      case "event" -> columns.add(Column.of(index, name, Column.Role.EVENT));
      default -> {
        Quantity quantity = choice.quantity().orElseThrow();
        columns.add(Column.value(index, name, quantity, statedUnit(choice, quantity, index)));
      }
    }
  }

  private CellUnit statedUnit(ColumnChoice choice, Quantity quantity, int index)
      throws LayoutException {
    boolean slashInName = table.indexOf(choice.name() + "/" + choice.tail()) == index;
    if (choice.tail().isEmpty() || slashInName) {
      return new ValueGuess(table, decimal, guesses).unit(index, quantity);
    }
    return CellUnit.parse(choice.tail(), quantity.kind())
        .orElseThrow(
            () ->
                new LayoutException(
                    0,
                    "--columns",
                    "'"
                        + choice.tail()
                        + "' is not a unit of "
                        + quantity.kind().words()
                        + "; use one of "
                        + quantity.kind().symbols()));
  }

  private Optional<ColumnChoice> choice(String word) {
    return choices.stream().filter(choice -> choice.word().equals(word)).findFirst();
  }

  private void findTime() throws LayoutException {
    Optional<ColumnChoice> choice = choice("time");
    int index = choice.isPresent() ? choice.get().index(table) : likeliestTime();
    String name = table.names().get(index);
    taken.add(index);
    columns.add(Column.of(index, name, Column.Role.TIME));
    int clock = clockBeside(index);
    List<String> cells = table.cells(index);
    if (clock >= 0) {
      taken.add(clock);
      columns.add(Column.of(clock, table.names().get(clock), Column.Role.CLOCK));
      guesses.add("'" + name + "' and '" + table.names().get(clock) + "' together make the time");
    }
    ZoneId used = zone.orElse(ZoneOffset.UTC);
    String tail = choice.map(ColumnChoice::tail).orElse("");
    form = tail.isEmpty() ? guessedForm(cells, used, name) : statedForm(tail, used);
    sayZone(cells, clock >= 0, name);
  }

  private TimeForm guessedForm(List<String> cells, ZoneId used, String name)
      throws LayoutException {
    TimeForm found =
        TimeGuess.of(cells, used, decimal, guesses)
            .orElseThrow(
                () ->
                    new LayoutException(
                        table.firstRow(),
                        name,
                        "'"
                            + cells.get(0)
                            + "' is not a time; write 2026-03-02T08:00:00Z, or say"
                            + " how it is written with --columns time="
                            + name
                            + "/dmy (mdy, ymd, s, ms, us, days)"));
    if (found.order().isEmpty()) {
      guesses.add("'" + name + "' holds " + found.words());
    }
    return found;
  }

  private TimeForm statedForm(String tail, ZoneId used) throws LayoutException {
    Optional<DateOrder> order = DateOrder.ofWord(tail);
    if (order.isPresent()) {
      return TimeForm.calendar(order.get(), used);
    }
    if (TimeForm.COUNTS.contains(tail)) {
      return TimeForm.count(tail, used, decimal);
    }
    throw new LayoutException(
        0,
        "--columns",
        "'" + tail + "' is not a way to write a time; use one of dmy, mdy, ymd, s, ms, us, days");
  }

  private void sayZone(List<String> cells, boolean clock, String name) {
    boolean open = form.order().isPresent() && (clock || !TimeGuess.hasOffset(cells));
    if (open && zone.isEmpty()) {
      guesses.add(
          "times in '"
              + name
              + "' carry no offset and were read as UTC; give --zone"
              + " (such as Europe/Vienna) if the logger kept local time");
    }
  }

  private int likeliestTime() throws LayoutException {
    int best = -1;
    for (int i = 0; i < table.width(); i++) {
      List<String> cells = table.cells(i);
      long times = cells.stream().filter(TimeGuess::looksLikeTime).count();
      if (taken.contains(i) || cells.isEmpty() || times < 0.8 * cells.size()) {
        continue;
      }
      boolean better = best < 0 || named(i) && !named(best);
      best = better ? i : best;
    }
    if (best < 0) {
      throw new LayoutException(
          table.headerLine(),
          "time",
          "no column holds times; name it with --columns time=NAME, the columns are "
              + table.namesInWords());
    }
    return best;
  }

  private boolean named(int column) {
    return RoleWords.isTime(table.names().get(column));
  }

  /** A column of times of day, needed when the dates stand alone. */
  private int clockBeside(int date) throws LayoutException {
    Optional<ColumnChoice> choice = choice("clock");
    if (choice.isPresent()) {
      return choice.get().index(table);
    }
    if (table.cells(date).stream().anyMatch(cell -> cell.indexOf(':') >= 0)) {
      return -1;
    }
    for (int i = 0; i < table.width(); i++) {
      List<String> cells = table.cells(i);
      if (i != date && !cells.isEmpty() && cells.stream().allMatch(TimeGuess::looksLikeClock)) {
        return i;
      }
    }
    return -1;
  }

  private void findTexts() {
    for (int i = 0; i < table.width(); i++) {
      List<String> cells = table.cells(i);
      boolean words = cells.stream().noneMatch(NumberGuess::looksLikeNumber);
      String name = table.names().get(i);
      if (taken.contains(i) || table.headerLine() == 0) {
        continue;
      }
      if (RoleWords.isEvent(name) && words) {
        columns.add(Column.of(i, name, Column.Role.EVENT));
        taken.add(i);
      } else if (words && !cells.isEmpty() && RoleWords.isVessel(name) && !hasVessels()) {
        columns.add(Column.of(i, name, Column.Role.VESSEL));
        guesses.add("'" + name + "' names the vessel");
        taken.add(i);
      }
    }
  }

  private boolean hasVessels() {
    return columns.stream().anyMatch(c -> c.role() == Column.Role.VESSEL || !c.vessel().isEmpty());
  }

  private void requirePressure() throws LayoutException {
    if (columns.stream().anyMatch(column -> column.holds(Quantity.PRESSURE))) {
      return;
    }
    throw new LayoutException(
        table.headerLine(),
        "pressure",
        "no column is recognised as the pressure; name it with --columns pressure=NAME/bar, the"
            + " columns are "
            + table.namesInWords());
  }

  private void sayUnused() {
    List<String> unused = new ArrayList<>();
    for (int i = 0; i < table.width(); i++) {
      int index = i;
      if (columns.stream().noneMatch(column -> column.index() == index)) {
        unused.add("'" + table.names().get(i) + "'");
      }
    }
    if (!unused.isEmpty()) {
      guesses.add("not used: " + String.join(", ", unused));
    }
  }
}

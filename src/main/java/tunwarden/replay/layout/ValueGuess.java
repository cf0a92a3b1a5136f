package tunwarden.replay.layout;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tunwarden.reading.Quantity;
import tunwarden.units.Display;
import tunwarden.units.Kind;
import tunwarden.units.Unit;

/** Which columns of numbers hold which quantity, in which unit. */
final class ValueGuess {
  private static final double BAR_MOST = 6;
  private static final double CELSIUS_MOST = 45;

  private final Table table;
  private final char decimal;
  private final List<String> guesses;

  ValueGuess(Table table, char decimal, List<String> guesses) {
    this.table = table;
    this.decimal = decimal;
    this.guesses = guesses;
  }

  /**
   * The columns of values not stated by the user.
   *
   * @param known columns already settled; their quantities are not looked for again
   * @param taken indices already used; those found are added
   */
  List<Column> find(List<Column> known, Set<Integer> taken) throws LayoutException {
    Map<Quantity, List<Integer>> candidates = new LinkedHashMap<>();
    for (int i = 0; i < table.width(); i++) {
      Optional<Quantity> quantity = RoleWords.quantity(header(i));
      boolean settled = quantity.isEmpty() || known.stream().anyMatch(c -> c.holds(quantity.get()));
      if (!taken.contains(i) && !settled && isNumeric(i)) {
        candidates.computeIfAbsent(quantity.get(), q -> new ArrayList<>()).add(i);
      }
    }
    Map<Integer, String> vessels = vessels(candidates);
    List<Column> found = new ArrayList<>();
    for (Map.Entry<Quantity, List<Integer>> entry : candidates.entrySet()) {
      List<Integer> use = vessels.isEmpty() ? entry.getValue().subList(0, 1) : entry.getValue();
      sayOthers(entry.getKey(), entry.getValue(), use);
      for (int index : use) {
        Column column =
            Column.value(
                index, table.names().get(index), entry.getKey(), unit(index, entry.getKey()));
        found.add(column.ofVessel(vessels.getOrDefault(index, "")));
        taken.add(index);
      }
    }
    return found;
  }

  private HeaderText header(int index) {
    HeaderText text = new HeaderText(table.names().get(index));
    String below = HeaderText.bare(table.units().get(index));
    return text.unitText().isEmpty() && !below.isEmpty()
        ? new HeaderText(text.name(), below, text.words())
        : text;
  }

  private boolean isNumeric(int index) {
    List<String> cells = table.cells(index);
    return cells.isEmpty() || cells.stream().anyMatch(NumberGuess::looksLikeNumber);
  }

  /** Vessel names by column, when several pressures each carry a different name; else empty. */
  private Map<Integer, String> vessels(Map<Quantity, List<Integer>> candidates) {
    List<Integer> pressures = candidates.getOrDefault(Quantity.PRESSURE, List.of());
    Map<Integer, String> names = new LinkedHashMap<>();
    Set<String> distinct = new HashSet<>();
    for (int index : pressures) {
      String name = RoleWords.residue(header(index));
      names.put(index, name);
      distinct.add(name);
    }
    if (pressures.size() < 2 || distinct.size() < pressures.size() || distinct.contains("")) {
      return Map.of();
    }
    for (Map.Entry<Quantity, List<Integer>> entry : candidates.entrySet()) {
      for (int index : entry.getValue()) {
        String name = RoleWords.residue(header(index));
        if (!distinct.contains(name)) {
          return Map.of();
        }
        names.put(index, name);
      }
    }
    guesses.add("each row speaks of several vessels: " + String.join(", ", distinct));
    return names;
  }

  private void sayOthers(Quantity quantity, List<Integer> all, List<Integer> used) {
    if (all.size() > used.size()) {
      guesses.add(
          "several columns could be the "
              + quantity.word()
              + "; '"
              + table.names().get(used.get(0))
              + "' was taken, another is chosen with --columns "
              + quantity.word()
              + "=NAME/UNIT");
    }
  }

  /** The unit of a column: as its header or its cells say, else by the size of its values. */
  CellUnit unit(int index, Quantity quantity) throws LayoutException {
    HeaderText header = header(index);
    Optional<CellUnit> stated = header.unit(quantity.kind());
    if (stated.isEmpty() && !header.unitText().isEmpty() && HeaderText.anyUnit(header.unitText())) {
      throw new LayoutException(
          table.headerLine(),
          table.names().get(index),
          "'" + header.unitText() + "' is not a unit of " + quantity.kind().words());
    }
    CellUnit unit = stated.or(() -> unitInCells(index, quantity.kind())).orElse(null);
    if (unit == null) {
      unit = bySize(index, quantity);
    }
    return quantity == Quantity.PRESSURE ? reference(index, header, unit) : unit;
  }

  private Optional<CellUnit> unitInCells(int index, Kind kind) {
    for (String cell : table.cells(index)) {
      String tail = cell.replaceFirst("^[-+.,\\d\u2212]+\\s*", "");
      Optional<CellUnit> unit = CellUnit.parse(tail, kind);
      if (unit.isPresent()) {
        return unit;
      }
    }
    return Optional.empty();
  }

  /** Gauge or absolute, as the unit or the name says; gauge, aloud, when neither does. */
  private CellUnit reference(int index, HeaderText header, CellUnit unit) {
    boolean absolute =
        unit.absolute()
            || header.words().stream().anyMatch(w -> w.startsWith("abs") || w.equals("pabs"));
    if (absolute) {
      guesses.add("'" + table.names().get(index) + "' is absolute; the atmosphere was taken off");
      return unit.asAbsolute();
    }
    if (!unit.gauge() && header.words().stream().noneMatch(w -> w.equals("gauge"))) {
      guesses.add(
          "'"
              + table.names().get(index)
              + "' was read as gauge pressure; if it is absolute, give --columns pressure=NAME/"
              + unit.symbol()
              + "a");
    }
    return unit.asGauge();
  }

  private CellUnit bySize(int index, Quantity quantity) throws LayoutException {
    double middle = middle(index);
    String name = table.names().get(index);
    CellUnit unit =
        switch (quantity) {
          case PRESSURE -> Math.abs(middle) <= BAR_MOST ? CellUnit.of(Unit.BAR) : null;
          case TEMPERATURE, HEADSPACE_TEMPERATURE ->
              CellUnit.of(middle <= CELSIUS_MOST ? Unit.CELSIUS : Unit.FAHRENHEIT);
          case GRAVITY -> middle < 2 ? CellUnit.of(Unit.SPECIFIC_GRAVITY) : CellUnit.of(Unit.PLATO);
          default -> null;
        };
    if (unit == null) {
      throw new LayoutException(
          table.headerLine(),
          name,
          "it states no unit, and values around "
              + Display.number(middle, 1)
              + " leave it open; give --columns "
              + quantity.word()
              + "="
              + name
              + "/UNIT with one of "
              + quantity.kind().symbols());
    }
    guesses.add(
        "'"
            + name
            + "' states no unit; by its size it was read as "
            + unit.symbol()
            + ", another is given with --columns "
            + quantity.word()
            + "=NAME/UNIT");
    return unit;
  }

  private double middle(int index) {
    double[] values =
        table.cells(index).stream()
            .mapToDouble(cell -> NumberGuess.value(cell, decimal))
            .filter(Double::isFinite)
            .sorted()
            .toArray();
    return values.length == 0 ? Double.NaN : values[values.length / 2];
  }
}

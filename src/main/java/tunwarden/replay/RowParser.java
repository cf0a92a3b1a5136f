package tunwarden.replay;

import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.reading.Fault;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.layout.CellUnit;
import tunwarden.replay.layout.Column;
import tunwarden.replay.layout.Layout;
import tunwarden.replay.text.Line;
import tunwarden.replay.text.Numbers;
import tunwarden.replay.text.TimeReader;

/** Turns the fields of one line into rows by a layout. Remembers the pass: one per reading. */
final class RowParser {
  private static final long SECOND_US = 1_000_000L;

  private final Layout layout;
  private final LogOptions options;
  private final LogNotes notes;
  private final TimeReader times;
  private final Column time;
  private final Optional<Column> clock;
  private final Optional<Column> vesselColumn;
  private final List<String> vesselsPerRow;
  private final StringBuilder joined = new StringBuilder();
  private String lastVessel = "";
  private String badField = "";
  private String badReason = "";

  RowParser(Layout layout, LogOptions options, LogNotes notes) {
    this.layout = layout;
    this.options = options;
    this.notes = notes;
    this.times = layout.time().open();
    this.time = layout.column(Column.Role.TIME).orElseThrow();
    this.clock = layout.column(Column.Role.CLOCK);
    this.vesselColumn = layout.column(Column.Role.VESSEL);
    this.vesselsPerRow = layout.vesselsPerRow();
  }

  ZoneOffset offset() {
    return times.offset();
  }

  long skippedHours() {
    return times.skippedHours();
  }

  String badField() {
    return badField;
  }

  String badReason() {
    return badReason;
  }

  /**
   * Reads a split line into {@code out}.
   *
   * @return false when it is no row; {@link #badField} and {@link #badReason} then say why
   */
  boolean read(Line line, List<LogRow> out) {
    badField = "";
    long us = timeOf(line);
    if (us == TimeReader.UNREADABLE) {
      return false;
    }
    long second = Math.floorDiv(us, SECOND_US);
    Instant at = Instant.ofEpochSecond(second, (us - second * SECOND_US) * 1000);
    int before = out.size();
    for (String vessel : vesselsPerRow) {
      String id = vessel.isEmpty() ? vesselOf(line) : vessel;
      List<Sample> samples = samples(line, at, vessel, id);
      if (samples == null) {
        while (out.size() > before) {
          out.remove(out.size() - 1);
        }
        return false;
      }
      out.add(new LogRow(line.number(), at, id, samples));
    }
    return true;
  }

  private long timeOf(Line line) {
    int field = time.index();
    if (line.length(field) == 0) {
      bad(time, "there is no time in this row");
      return TimeReader.UNREADABLE;
    }
    long us;
    if (clock.isPresent()) {
      joined.setLength(0);
      joined.append(line.field(field)).append(' ').append(line.field(clock.get().index()));
      us = times.read(joined.toString().toCharArray(), 0, joined.length());
    } else {
      us = times.read(line.cells(), line.from(field), line.to(field));
    }
    if (us == TimeReader.UNREADABLE) {
      String text = clock.isPresent() ? joined.toString() : line.field(field);
      bad(time, "'" + shorten(text) + "' is not a time " + layout.time().words());
    }
    return us;
  }

  private String vesselOf(Line line) {
    if (vesselColumn.isEmpty()) {
      return options.vessel();
    }
    int field = vesselColumn.get().index();
    if (line.length(field) == 0) {
      return options.vessel();
    }
    if (!isSame(line, field, lastVessel)) {
      lastVessel = line.field(field);
    }
    return lastVessel;
  }

  private static boolean isSame(Line line, int field, String text) {
    if (line.length(field) != text.length()) {
      return false;
    }
    for (int i = 0; i < text.length(); i++) {
      if (line.cells()[line.from(field) + i] != text.charAt(i)) {
        return false;
      }
    }
    return true;
  }

  /** The samples of one vessel in the row; null when a cell cannot be read. */
  private List<Sample> samples(Line line, Instant at, String columnVessel, String id) {
    List<Sample> samples = new ArrayList<>(4);
    double ambientPa = options.ambientPaAbsolute();
    double u95 = 0;
    for (Column column : layout.columns()) {
      int field = column.index();
      if (!column.vessel().isEmpty() && !column.vessel().equals(columnVessel)) {
        continue;
      }
      if (column.role() == Column.Role.EVENT && line.length(field) > 0) {
        samples.add(new Mark(at, id, line.field(field)));
      }
      if (column.unit().isEmpty() || line.length(field) == 0) {
        continue;
      }
      if (Numbers.isMissing(line.cells(), line.from(field), line.to(field))) {
        notes.countMissing();
        if (column.role() == Column.Role.VALUE) {
          samples.add(
              new Fault(at, id, column.quantity().get(), Quality.NOT_FINITE, line.field(field)));
        }
        continue;
      }
      double si = si(line, column);
      if (Double.isNaN(si)) {
        return null;
      }
      if (column.role() == Column.Role.UNCERTAINTY) {
        u95 = Math.abs(si);
        continue;
      }
      if (column.holds(Quantity.BAROMETER)) {
        ambientPa = si;
      }
      samples.add(reading(column, at, id, si, ambientPa, u95));
    }
    return samples;
  }

  private static Reading reading(
      Column column, Instant at, String id, double si, double ambientPa, double u95) {
    Quantity quantity = column.quantity().get();
    boolean gaugeFromAbsolute = quantity == Quantity.PRESSURE && column.unit().get().absolute();
    return new Reading(
        at,
        id,
        quantity,
        gaugeFromAbsolute ? si - ambientPa : si,
        quantity == Quantity.DISSOLVED ? u95 : 0,
        Quality.GOOD);
  }

  /** The cell in SI; NaN, with the reason kept, when it is no number. */
  private double si(Line line, Column column) {
    int field = column.index();
    CellUnit unit = column.unit().get();
    double written =
        Numbers.parse(line.cells(), line.from(field), line.to(field), layout.decimal());
    if (Double.isNaN(written)) {
      return withUnitInCell(line.field(field), column);
    }
    return column.role() == Column.Role.UNCERTAINTY
        ? unit.differenceToSi(written)
        : unit.toSi(written);
  }

  /** A cell such as {@code "0.873 bar"}: accepted in the column's own unit, refused in another. */
  private double withUnitInCell(String cell, Column column) {
    int split = 0;
    while (split < cell.length() && "+-.,0123456789\u2212".indexOf(cell.charAt(split)) >= 0) {
      split++;
    }
    CellUnit unit = column.unit().get();
    double written = Numbers.parse(cell.toCharArray(), 0, split, layout.decimal());
    Optional<CellUnit> inCell = CellUnit.parse(cell.substring(split), unit.kind());
    if (Double.isNaN(written) || inCell.isEmpty()) {
      bad(column, "'" + shorten(cell) + "' is not a number");
      return Double.NaN;
    }
    if (inCell.get().scale() != unit.scale() || inCell.get().offset() != unit.offset()) {
      bad(column, "'" + shorten(cell) + "' while the column is in " + unit.words());
      return Double.NaN;
    }
    return unit.toSi(written);
  }

  private void bad(Column column, String reason) {
    badField = column.name();
    badReason = reason;
  }

  private static String shorten(String text) {
    return text.length() <= 40 ? text : text.substring(0, 37) + "...";
  }
}

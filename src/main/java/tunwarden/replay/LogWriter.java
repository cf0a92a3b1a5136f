package tunwarden.replay;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import tunwarden.reading.Mark;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.layout.NativeLayout;
import tunwarden.replay.text.Decimals;
import tunwarden.units.Extract;
import tunwarden.units.Unit;

/** Writes rows in our own log format. Lines end in a line feed on every system. */
public final class LogWriter {
  private static final DateTimeFormatter SECONDS =
      DateTimeFormatter.ofPattern("yyyy-MM-dd'T'HH:mm:ss'Z'").withZone(ZoneOffset.UTC);
  private static final DateTimeFormatter MILLISECONDS =
      DateTimeFormatter.ofPattern("yyyy-MM-dd'T'HH:mm:ss.SSS'Z'").withZone(ZoneOffset.UTC);

  private final Appendable out;
  private final Columns columns;
  private final StringBuilder text = new StringBuilder();

  /**
   * Which columns a log has besides {@code time}.
   *
   * @param quantities value columns, in this order
   * @param vessel whether a column names the vessel
   * @param event whether a column holds remarks
   */
  public record Columns(List<Quantity> quantities, boolean vessel, boolean event) {
    /** Pressure and temperature of one vessel. */
    public static final Columns PLAIN =
        new Columns(List.of(Quantity.PRESSURE, Quantity.TEMPERATURE), false, false);

    /** The first line of the log, without its line end. */
    public String header() {
      StringBuilder header = new StringBuilder("time");
      header.append(vessel ? ",vessel" : "");
      for (Quantity quantity : quantities) {
        header.append(',').append(quantity.column());
        if (quantity == Quantity.DISSOLVED) {
          header.append(',').append(NativeLayout.DISSOLVED_U95);
        }
      }
      return header.append(event ? ",event" : "").toString();
    }
  }

  public LogWriter(Appendable out, Columns columns) {
    this.out = out;
    this.columns = columns;
  }

  /** Writes one comment line; a line break inside becomes a blank. */
  public void comment(String remark) {
    put("# " + remark.replace('\n', ' ').replace('\r', ' ') + "\n");
  }

  /** Writes the line of names. */
  public void header() {
    put(columns.header() + "\n");
  }

  /** Writes one row; a faulty value leaves its cell blank. */
  public void write(LogRow row) {
    put(line(row) + "\n");
  }

  /** One row as text, without its line end. */
  public String line(LogRow row) {
    Map<Quantity, Reading> values = new EnumMap<>(Quantity.class);
    StringBuilder marks = new StringBuilder();
    for (Sample sample : row.samples()) {
      if (sample instanceof Reading reading) {
        values.put(reading.quantity(), reading);
      } else if (sample instanceof Mark mark) {
        marks.append(marks.isEmpty() ? "" : "; ").append(mark.text());
      }
    }
    text.setLength(0);
    text.append(timeText(row.time()));
    if (columns.vessel()) {
      text.append(',').append(quoted(row.vessel()));
    }
    for (Quantity quantity : columns.quantities()) {
      append(quantity, values.get(quantity));
    }
    if (columns.event()) {
      text.append(',').append(quoted(marks.toString()));
    }
    return text.toString();
  }

  private void append(Quantity quantity, Reading reading) {
    text.append(',');
    if (reading != null) {
      Decimals.append(text, written(reading), decimals(quantity));
    }
    if (quantity == Quantity.DISSOLVED) {
      text.append(',');
      if (reading != null && reading.u95() > 0) {
        Decimals.append(text, reading.u95(), decimals(quantity));
      }
    }
  }

  /** The value in the unit that the column's name fixes. */
  private static double written(Reading reading) {
    double si = reading.value();
    return switch (reading.quantity()) {
      case PRESSURE, BAROMETER -> Unit.BAR.fromSi(si);
      case TEMPERATURE, HEADSPACE_TEMPERATURE -> Unit.CELSIUS.fromSi(si);
      case LEVEL -> Unit.LITRE.fromSi(si);
      case GRAVITY -> Extract.gravityFromPlato(si);
      case DISSOLVED -> si;
    };
  }

  private static int decimals(Quantity quantity) {
    return switch (quantity) {
      case PRESSURE, BAROMETER, GRAVITY -> 5;
      default -> 3;
    };
  }

  /** UTC, with milliseconds only where there are any. */
  public static String timeText(Instant time) {
    return time.getNano() < 1_000_000 ? SECONDS.format(time) : MILLISECONDS.format(time);
  }

  /** Quoted where it must be (RFC 4180); a line break becomes a blank. */
  static String quoted(String field) {
    String flat = field.replace('\n', ' ').replace('\r', ' ');
    boolean plain = flat.indexOf(',') < 0 && flat.indexOf('"') < 0;
    return plain ? flat : '"' + flat.replace("\"", "\"\"") + '"';
  }

  private void put(String characters) {
    try {
      out.append(characters);
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}

package tunwarden.forecast;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Rows of a table of published values under {@code src/test/resources/reference}. */
public final class ReferenceRows {
  private ReferenceRows() {}

  /** All rows of the table. */
  public static List<NamedCsvRecord> of(String name) {
    var stream = ReferenceRows.class.getResourceAsStream("/reference/" + name + ".csv");
    try (var reader = new InputStreamReader(stream, StandardCharsets.UTF_8)) {
      return CsvReader.builder().ofNamedCsvRecord(reader).stream().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The row with that value in that column. */
  public static NamedCsvRecord row(String name, String column, String value) {
    return of(name).stream()
        .filter(r -> r.getField(column).equals(value))
        .findFirst()
        .orElseThrow();
  }

  /** A field as a number. */
  public static double number(NamedCsvRecord row, String column) {
    return Double.parseDouble(row.getField(column));
  }
}

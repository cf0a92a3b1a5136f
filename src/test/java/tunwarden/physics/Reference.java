package tunwarden.physics;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;

/** Reads the tables of published values beside the tests; the last column of each is its source. */
public final class Reference {
  private static final Path FOLDER = Path.of("src/test/resources/reference");

  private Reference() {}

  /** All rows of a table. */
  public static List<NamedCsvRecord> rows(String table) {
    Path file = FOLDER.resolve(table + ".csv");
    try (CsvReader<NamedCsvRecord> reader = CsvReader.builder().ofNamedCsvRecord(file)) {
      return reader.stream().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A cell as a number. */
  public static double number(NamedCsvRecord row, String column) {
    return Double.parseDouble(row.getField(column));
  }

  /** A temperature of a table, K. */
  public static double kelvin(double celsius) {
    return celsius + 273.15;
  }
}

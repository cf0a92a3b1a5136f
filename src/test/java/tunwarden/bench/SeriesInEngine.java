package tunwarden.bench;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Locale;

/**
 * Loads the series of a fleet, as {@code report FOLDER --series DIR} writes them, into an SQL
 * engine: the vessel comes from the folder's name; then once more from Parquet written by vessel. A
 * program to run by hand with the benchmark profile: {@code SeriesInEngine DIR}.
 */
public final class SeriesInEngine {
  private SeriesInEngine() {}

  /** Prints what the engine says of each vessel, from the CSV and from Parquet; they must agree. */
  public static void main(String[] args) throws Exception {
    Path parquet = Files.createTempDirectory("tunwarden-parquet");
    try (Connection engine = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = engine.createStatement()) {
      String csv =
          "read_csv('" + args[0] + "/*/series.csv', hive_partitioning = true, header = true)";
      statement.execute(
          "copy (select * from "
              + csv
              + ") to '"
              + parquet
              + "' (format parquet, partition_by (vessel), overwrite_or_ignore)");
      String fromCsv = summary(statement, csv);
      String fromParquet =
          summary(
              statement, "read_parquet('" + parquet + "/*/*.parquet', hive_partitioning = true)");
      System.out.print(fromCsv);
      if (!fromCsv.equals(fromParquet)) {
        throw new IllegalStateException("Parquet says otherwise:\n" + fromParquet);
      }
      System.out.println("the same from Parquet");
    }
  }

  private static String summary(Statement statement, String table) throws SQLException {
    StringBuilder text = new StringBuilder();
    String sql =
        "select vessel, count(*), min(time)::timestamp::text, max(pressure_bar_g),"
            + " min(relief_margin_bar), avg(dissolved_g_per_l), count(event) from "
            + table
            + " group by vessel order by min(relief_margin_bar)";
    try (ResultSet rows = statement.executeQuery(sql)) {
      while (rows.next()) {
        text.append(
            String.format(
                Locale.ROOT,
                "%s: %d rows from %s, peak %.3f bar g, least margin %.3f bar, mean %.2f g/L,"
                    + " %d rows with events%n",
                rows.getString(1),
                rows.getLong(2),
                rows.getString(3),
                rows.getDouble(4),
                rows.getDouble(5),
                rows.getDouble(6),
                rows.getLong(7)));
      }
    }
    return text.toString();
  }
}

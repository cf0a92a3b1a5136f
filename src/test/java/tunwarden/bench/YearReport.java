package tunwarden.bench;

import com.sun.management.OperatingSystemMXBean;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.lang.management.ManagementFactory;
import java.lang.management.MemoryPoolMXBean;
import java.lang.management.MemoryType;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.Statement;
import java.util.Locale;
import tunwarden.app.Main;

/**
 * A report on a long log and, in the same process one after the other, DuckDB's scan of the file
 * for its highest pressure: the time an engine made for it needs merely to read the numbers. A
 * program to run by hand with the benchmark profile: {@code YearReport FILE ROUNDS}.
 */
public final class YearReport {
  private static final OperatingSystemMXBean SYSTEM =
      (OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean();

  private YearReport() {}

  /** What is timed. */
  private interface Work {
    double run() throws Exception;
  }

  /** Clock and processor time of the best round, s. */
  private record Spent(double clockS, double processorS) {
    Spent orBetter(Spent other) {
      return other.processorS < processorS ? other : this;
    }
  }

  /** Prints one line a round and the ratios of the best rounds. */
  public static void main(String[] args) throws Exception {
    String file = args[0];
    Spent report = new Spent(Double.MAX_VALUE, Double.MAX_VALUE);
    Spent scan = report;
    for (int round = 1; round <= Integer.parseInt(args[1]); round++) {
      scan = scan.orBetter(time("DuckDB scan", () -> scan(file)));
      report = report.orBetter(time("report", () -> report(file)));
    }
    System.out.printf(
        Locale.ROOT,
        "%,d MB; best of each: ratio %.1f by the clock, %.1f by processor time; most heap %d MB%n",
        Files.size(Path.of(file)) / 1_000_000,
        report.clockS() / scan.clockS(),
        report.processorS() / scan.processorS(),
        heapPeak() / 1_000_000);
  }

  private static Spent time(String name, Work work) throws Exception {
    long cpu = SYSTEM.getProcessCpuTime();
    long clock = System.nanoTime();
    double answer = work.run();
    Spent spent =
        new Spent((System.nanoTime() - clock) / 1e9, (SYSTEM.getProcessCpuTime() - cpu) / 1e9);
    System.out.printf(
        Locale.ROOT,
        "%-12s %6.2f s clock %6.2f s processor  (%.5f)%n",
        name,
        spent.clockS(),
        spent.processorS(),
        answer);
    return spent;
  }

  private static double scan(String file) throws Exception {
    String sql = "select max(pressure_bar_g) from read_csv('" + file + "')";
    try (Connection engine = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = engine.createStatement();
        ResultSet rows = statement.executeQuery(sql)) {
      rows.next();
      return rows.getDouble(1);
    }
  }

  /** The command as a person would give it, in process; returns the peak it tells. */
  private static double report(String file) {
    StringWriter json = new StringWriter();
    StringWriter said = new StringWriter();
    int code =
        Main.run(
            new PrintWriter(json),
            new PrintWriter(said),
            ("report " + file + " --json - --every 60s --volume 2000L --fill 1800L --liquid beer")
                .concat(" --relief 1.5bar")
                .split(" "));
    if (code != 0) {
      throw new IllegalStateException(said.toString());
    }
    String text = json.toString();
    int at = text.indexOf("peak_pressure_bar_g");
    return Double.parseDouble(text.substring(text.indexOf(':', at) + 1, text.indexOf(',', at)));
  }

  private static long heapPeak() {
    long peak = 0;
    for (MemoryPoolMXBean pool : ManagementFactory.getMemoryPoolMXBeans()) {
      peak += pool.getType() == MemoryType.HEAP ? pool.getPeakUsage().getUsed() : 0;
    }
    return peak;
  }
}

package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A folder of logs: a table of all vessels, the least margin first, and a file for each. */
class FleetTest {
  @TempDir Path folder;

  private Path log(String name, int from, int rows, double bar) throws IOException {
    StringBuilder text = new StringBuilder("time,pressure_bar_g,temperature_c\n");
    Instant start = Instant.parse("2026-03-02T08:00:00Z");
    for (int i = from; i < from + rows; i++) {
      text.append(start.plusSeconds(i)).append(',').append(bar + 0.001 * (i % 3));
      text.append(",5.2").append(i % 2).append('\n');
    }
    Path file = folder.resolve("logs").resolve(name);
    Files.createDirectories(file.getParent());
    return Files.writeString(file, text);
  }

  private Ran report(String... more) {
    String tank = "--volume 2000L --fill 1800L --liquid beer --relief 1.5bar";
    String all = "report " + folder.resolve("logs") + " " + tank;
    return Ran.tunwarden((all + " " + String.join(" ", more)).strip().split(" "));
  }

  @Test
  void theLeastMarginComesFirstAndAFailureLast() throws IOException {
    log("calm.csv", 0, 300, 0.6);
    log("close.csv", 0, 300, 1.2);
    log("FV2/2026-03-03.csv", 300, 300, 0.9);
    log("FV2/2026-03-02.csv", 0, 300, 0.9);
    Files.writeString(folder.resolve("logs/broken.csv"), "nothing,here\n1,2\n");
    Files.writeString(folder.resolve("logs/notes.txt"), "not a log");
    Ran ran = report();
    assertEquals(1, ran.code(), ran.err());
    List<String> lines = ran.out().lines().toList();
    assertEquals(5, lines.size(), ran.out());
    assertTrue(lines.get(0).startsWith("vessel  margin bar"), ran.out());
    assertTrue(lines.get(1).matches("close +0\\.19 .* 300"), ran.out());
    assertTrue(lines.get(2).matches("FV2 +0\\.49 .* 600"), ran.out());
    assertTrue(lines.get(3).matches("calm +0\\.79 .* 300"), ran.out());
    assertTrue(lines.get(4).startsWith("broken  ! "), ran.out());
  }

  @Test
  void everyVesselGetsItsFiles() throws IOException {
    log("a.csv", 0, 120, 0.6);
    log("b.csv", 0, 120, 0.7);
    Path out = folder.resolve("out");
    Ran ran = report("--json", out + "/json", "--html", out + "/html", "--series", out + "/series");
    assertEquals(0, ran.code(), ran.err());
    for (String name : List.of("a", "b")) {
      assertTrue(Files.size(out.resolve("json/" + name + ".json")) > 100);
      assertTrue(Files.size(out.resolve("html/" + name + ".html")) > 100);
      Path series = out.resolve("series/vessel=" + name + "/series.csv");
      assertEquals(121, Files.readAllLines(series).size());
    }
  }

  @Test
  void aFolderWithoutLogsAndOptionsThatDoNotFitAreRefused() throws IOException {
    Files.createDirectories(folder.resolve("logs/empty"));
    assertTrue(report().refused().contains("it holds no logs"));
    assertTrue(report("--json", "-").refused().contains("--json"));
    assertTrue(report("--what-if", "relief=1.2bar").refused().contains("--what-if"));
  }
}

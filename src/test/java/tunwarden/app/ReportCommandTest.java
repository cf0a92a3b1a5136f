package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The command that tells what happened in a log. */
class ReportCommandTest {
  private static final List<String> TANK =
      List.of("--volume", "2000 L", "--fill", "1800 L", "--liquid", "beer", "--relief", "1.5 bar");

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  @TempDir Path folder;

  private int run(String... args) {
    String[] all = Stream.concat(Stream.of(args), TANK.stream()).toArray(String[]::new);
    return Main.run(new PrintWriter(out), new PrintWriter(err), all);
  }

  private Path log(String text) throws IOException {
    return Files.writeString(folder.resolve("log.csv"), text);
  }

  private static String rows(int count) {
    StringBuilder text = new StringBuilder("time,pressure_bar_g,temperature_c\n");
    for (int i = 0; i < count; i++) {
      text.append("2026-03-02T08:").append(String.format("%02d:%02d", i / 60, i % 60));
      text.append("Z,0.87").append(i % 3).append(",5.2").append(i % 2).append('\n');
    }
    return text.toString();
  }

  @Test
  void theJsonHoldsWhatOthersRelyOn() throws IOException {
    assertEquals(0, run("report", log(rows(600)).toString(), "--json", "-"), err.toString());
    JsonNode report = new ObjectMapper().readTree(out.toString());
    assertEquals(600, report.get("rows").asInt());
    assertEquals("vessel", report.get("vessel").asText());
    assertEquals("2026-03-02T08:00:00Z", report.get("from").asText());
    assertEquals("2026-03-02T08:09:59Z", report.get("to").asText());
    assertEquals(0.872, report.get("peak_pressure_bar_g").asDouble(), 1e-9);
    assertEquals(1.4 - 0.872 - 0.01, report.get("least_relief_margin_bar").asDouble(), 1e-9);
    assertEquals(0, report.get("gas_lost_g").asDouble());
    assertEquals(0, report.get("events").size());
  }

  @Test
  void theSeriesHasOneLinePerRowOrPerStretch() throws IOException {
    Path log = log(rows(600));
    assertEquals(0, run("report", log.toString(), "--series", "-"));
    List<String> lines = out.toString().lines().toList();
    assertEquals(601, lines.size());
    assertEquals(
        "time,pressure_bar_g,temperature_c,dissolved_g_per_l,dissolved_u95_g_per_l,"
            + "equilibrium_g_per_l,settled,relief_margin_bar,quality,event",
        lines.get(0));
    assertTrue(lines.get(1).startsWith("2026-03-02T08:00:00Z,0.87,5.2,"), lines.get(1));
    out.getBuffer().setLength(0);
    assertEquals(0, run("report", log.toString(), "--series", "-", "--every", "60s"));
    assertEquals(11, out.toString().lines().count());
  }

  @Test
  void withoutAFileItTellsTheSummary() throws IOException {
    assertEquals(0, run("report", log(rows(60)).toString()));
    assertTrue(out.toString().contains("No opening of the relief valve is seen"));
  }

  @Test
  void badInputIsToldInOneSentence() throws IOException {
    refused("log.csv: the file is empty", log("").toString());
    refused("there is no such file", folder.resolve("none.csv").toString());
    String good = log(rows(60)).toString();
    refused("--what-if", good, "--what-if", "moon=full");
    refused("does not cover", good, "--what-if", "vent=23:00@0.3bar");
    refused("is not a zone", good, "--zone", "Mars/Olympus");
    refused("--compare", good, "--compare");
    refused("no column 'x'", good, "--columns", "pressure=x/bar");
    refused(
        "no row speaks of FV9",
        log(rows(5).replace("time,", "time,vessel,").replace("Z,", "Z,FV1,")).toString(),
        "--vessel",
        "FV9");
  }

  private void refused(String piece, String... args) {
    err.getBuffer().setLength(0);
    String[] all = Stream.concat(Stream.of("report"), Stream.of(args)).toArray(String[]::new);
    assertEquals(2, run(all), err.toString());
    assertTrue(err.toString().contains(piece), err.toString());
    assertEquals(1, err.toString().lines().count(), err.toString());
  }

  @Test
  void severalVesselsMustBeChosenFrom() throws IOException {
    String text =
        "time,vessel,pressure_bar_g,temperature_c\n"
            + "2026-03-02T08:00:00Z,FV1,0.8,5\n2026-03-02T08:00:00Z,FV2,1.2,5\n"
            + "2026-03-02T08:00:10Z,FV1,0.8,5\n2026-03-02T08:00:10Z,FV2,1.2,5\n";
    refused("choose with --vessel one of FV1, FV2", log(text).toString());
    assertEquals(0, run("report", log(text).toString(), "--vessel", "FV2", "--json", "-"));
    assertTrue(out.toString().contains("\"peak_pressure_bar_g\" : 1.2"), out.toString());
    String page = folder.resolve("both.html").toString();
    String[] both = {
      "report",
      log(text).toString(),
      "--vessel",
      "FV1",
      "--vessel",
      "FV2",
      "--compare",
      "--html",
      page
    };
    assertEquals(0, run(both), err.toString());
    assertTrue(Files.readString(Path.of(page)).contains("Side by side"));
  }
}

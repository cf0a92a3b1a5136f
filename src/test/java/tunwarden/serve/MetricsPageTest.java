package tunwarden.serve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The metrics page, by its names and by the reference parser of the format. */
class MetricsPageTest {
  private final ServeFixture fixture = new ServeFixture();
  @TempDir private Path folder;

  private String page() throws IOException {
    return new String(new MetricsPage().write(fixture.served()), StandardCharsets.UTF_8);
  }

  @Test
  void everyPromisedNameIsThere() throws IOException {
    String page = page();
    for (String line :
        List.of(
            "tunwarden_pressure_bar_gauge{vessel=\"FV2\"} 1.31",
            "tunwarden_temperature_celsius{vessel=\"FV2\"} 4.0",
            "tunwarden_dissolved_grams_per_litre{vessel=\"FV2\"} 5.3",
            "tunwarden_dissolved_uncertainty_grams_per_litre{vessel=\"FV2\"} 0.2",
            "tunwarden_reading_age_seconds{vessel=\"FV2\"} 30.0",
            "tunwarden_alarms{state=\"unacknowledged\",vessel=\"FV2\"} 1.0",
            "tunwarden_readings_total{quality=\"good\",vessel=\"BT1\"} 3.0")) {
      assertTrue(page.contains(line + "\n"), line + "\n" + page);
    }
    assertTrue(page.matches("(?s).*tunwarden_relief_margin_bar\\{vessel=\"FV2\"} 0\\.0[78].*"));
    assertTrue(page.endsWith("# EOF\n"));
  }

  @Test
  void aSilentInstrumentHasAnAgeButNoPressure() throws IOException {
    String page = page();
    assertFalse(page.contains("tunwarden_pressure_bar_gauge{vessel=\"FV3\"}"));
    assertTrue(page.contains("tunwarden_reading_age_seconds{vessel=\"FV3\"} 30.0"));
    assertTrue(page.contains("tunwarden_alarms{state=\"unacknowledged\",vessel=\"FV3\"} 1.0"));
  }

  @Test
  void theReferenceParserReadsThePage() throws Exception {
    Optional<String> python = pythonWithParser();
    assumeTrue(
        python.isPresent(),
        "skipped: no python3 with prometheus_client (python3-prometheus-client)");
    Path file = folder.resolve("metrics.txt");
    Files.writeString(file, page());
    String script =
        """
        import sys
        from prometheus_client.openmetrics.parser import text_string_to_metric_families as parse
        for f in parse(open(sys.argv[1], encoding='utf-8').read()):
            for s in f.samples: print(f.type, s.name, s.labels.get('vessel'), s.value)
        """;
    Process process =
        new ProcessBuilder(python.get(), "-c", script, file.toString())
            .redirectErrorStream(true)
            .start();
    String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertTrue(process.waitFor(30, TimeUnit.SECONDS));
    assertEquals(0, process.exitValue(), out);
    assertTrue(out.contains("gauge tunwarden_pressure_bar_gauge FV2 1.31"), out);
    assertTrue(out.contains("counter tunwarden_readings_total BT1 3.0"), out);
  }

  private static Optional<String> pythonWithParser() throws Exception {
    for (String python : List.of("python3", "/usr/bin/python3")) {
      try {
        Process process =
            new ProcessBuilder(python, "-c", "import prometheus_client.openmetrics.parser")
                .redirectErrorStream(true)
                .start();
        process.getInputStream().readAllBytes();
        if (process.waitFor(30, TimeUnit.SECONDS) && process.exitValue() == 0) {
          return Optional.of(python);
        }
      } catch (IOException absent) {
        continue;
      }
    }
    return Optional.empty();
  }
}

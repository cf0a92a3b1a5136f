package tunwarden.packaging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Moves the self-contained image elsewhere and uses it with no Java in reach. */
@Tag("image")
class ImageIT {
  private static final long MOST_BYTES = 90_000_000;

  @TempDir private static Path folder;
  private static Path home;

  @BeforeAll
  static void move() throws IOException {
    Path image = Path.of("target/image/tunwarden");
    home = folder.resolve("a place/tunwarden");
    try (Stream<Path> files = Files.walk(image)) {
      for (Path file : (Iterable<Path>) files::iterator) {
        Path target = home.resolve(image.relativize(file).toString());
        Files.createDirectories(target.getParent());
        if (!Files.isDirectory(file)) {
          Files.copy(file, target, java.nio.file.StandardCopyOption.COPY_ATTRIBUTES);
        }
      }
    }
  }

  private static String run(int expected, String... args) throws Exception {
    List<String> command = new ArrayList<>();
    command.add(home.resolve("bin/tunwarden").toString());
    command.addAll(List.of(args));
    Path output = Files.createTempFile(folder, "out", ".txt");
    ProcessBuilder builder = new ProcessBuilder(command).redirectErrorStream(true);
    builder.redirectOutput(output.toFile());
    builder.environment().remove("JAVA_HOME");
    builder.environment().put("PATH", folder.toString());
    builder.environment().put("XDG_STATE_HOME", folder.resolve("state").toString());
    Process process = builder.start();
    assertTrue(process.waitFor(120, TimeUnit.SECONDS), "still running");
    String out = Files.readString(output);
    assertEquals(expected, process.exitValue(), out);
    return out;
  }

  @Test
  void itAnswersReportsAndPassesTheExitCodeOn() throws Exception {
    String[] right = "reckon dissolved --pressure 1bar --temperature 4C --liquid beer".split(" ");
    assertTrue(run(0, right).startsWith("dissolved      5."));
    run(2, "reckon", "nothing");
    String log = Path.of("replay-logs/cooling-lost.csv").toAbsolutePath().toString();
    Path page = folder.resolve("page.html");
    run(
        0,
        ("report " + log + " --vessel FV2 --volume 2000L --fill 1800L --liquid beer --html " + page)
            .split(" "));
    assertTrue(Files.size(page) > 1000);
  }

  @Test
  void itsRuntimeHoldsWhatPortsNoticesAndServingNeed() throws Exception {
    run(0, "instruments", "list");
    run(0, "instruments", "ports");
    assertFalse(run(0, "headless", "--help").isBlank());
  }

  @Test
  void itIsSmallEnoughForAnOldMachine() throws IOException {
    try (Stream<Path> files = Files.walk(home)) {
      long bytes =
          files.mapToLong(file -> file.toFile().isFile() ? file.toFile().length() : 0).sum();
      assertTrue(bytes < MOST_BYTES, bytes + " bytes");
    }
  }
}

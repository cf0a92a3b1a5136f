package tunwarden.packaging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Unpacks the zip that the build made, in a folder with a space in its name, and uses it. */
class PackageIT {
  @TempDir private static Path folder;
  private static Path home;
  private static Path cache;

  private record Ran(int code, String out) {}

  @BeforeAll
  static void unpack() throws IOException {
    Path zip;
    try (Stream<Path> files = Files.list(Path.of("target"))) {
      zip =
          files.filter(f -> f.toString().matches(".*tunwarden-.*\\.zip")).findFirst().orElseThrow();
    }
    Path place = Files.createDirectory(folder.resolve("a place"));
    try (ZipInputStream in = new ZipInputStream(Files.newInputStream(zip))) {
      for (ZipEntry entry = in.getNextEntry(); entry != null; entry = in.getNextEntry()) {
        Path target = place.resolve(entry.getName());
        if (entry.isDirectory()) {
          Files.createDirectories(target);
        } else {
          Files.createDirectories(target.getParent());
          Files.copy(in, target);
        }
      }
    }
    String name = zip.getFileName().toString();
    home = place.resolve(name.substring(0, name.length() - ".zip".length()));
    cache = folder.resolve("cache");
  }

  private static Ran run(boolean archive, String... command) throws Exception {
    Path output = Files.createTempFile(folder, "out", ".txt");
    ProcessBuilder builder = new ProcessBuilder(command).redirectErrorStream(true);
    builder.redirectOutput(output.toFile());
    builder.environment().put("JAVA_HOME", System.getProperty("java.home"));
    builder.environment().put("XDG_CACHE_HOME", cache.toString());
    builder.environment().put("LC_ALL", "C.UTF-8");
    if (!archive) {
      builder.environment().put("TUNWARDEN_NO_ARCHIVE", "1");
    }
    Process process = builder.start();
    assertTrue(process.waitFor(60, TimeUnit.SECONDS), "still running");
    return new Ran(process.exitValue(), Files.readString(output));
  }

  private static String[] launcher(String... args) {
    assumeTrue(Files.isExecutable(Path.of("/bin/sh")), "no POSIX shell here: launcher not run");
    List<String> command = new ArrayList<>();
    command.add("/bin/sh");
    command.add(home.resolve("bin/tunwarden").toString());
    command.addAll(List.of(args));
    return command.toArray(String[]::new);
  }

  @Test
  void theLauncherAnswersAndPassesTheExitCodeOn() throws Exception {
    String[] right = "reckon dissolved --pressure 1bar --temperature 4C --liquid beer".split(" ");
    Ran ran = run(false, launcher(right));
    assertEquals(0, ran.code(), ran.out());
    assertTrue(ran.out().startsWith("dissolved      5."), ran.out());
    assertEquals(2, run(false, launcher("reckon", "nothing")).code());
  }

  @Test
  void theFirstStartMakesAnArchiveThatTheNextOneUses() throws Exception {
    assertEquals(0, run(true, launcher("--version")).code());
    Instant end = Instant.now().plus(Duration.ofSeconds(120));
    while (archives().isEmpty() && Instant.now().isBefore(end)) {
      Thread.sleep(200);
    }
    assertEquals(1, archives().size(), "one archive, made in the background");
    Ran ran = run(true, launcher("--version"));
    assertTrue(ran.out().matches("tunwarden \\d+\\.\\d+\\.\\d+\\R"), ran.out());
  }

  private static List<Path> archives() throws IOException {
    if (!Files.isDirectory(cache.resolve("tunwarden"))) {
      return List.of();
    }
    try (Stream<Path> files = Files.list(cache.resolve("tunwarden"))) {
      return files.filter(file -> file.toString().endsWith(".jsa")).toList();
    }
  }

  @Test
  void everythingAPersonNeedsIsInIt() throws IOException {
    for (String file :
        List.of(
            "LICENSE",
            "README.md",
            "bin/tunwarden",
            "bin/tunwarden.cmd",
            "lib/tunwarden.classlist",
            "lib/tunwarden.jar",
            "lib/lib/lanterna-3.1.3.jar",
            "lib/native/Linux/x86_64/libjSerialComm.so",
            "lib/native/Windows/x86_64/jSerialComm.dll",
            "devices/text-line.json",
            "completion/tunwarden.bash",
            "man/man1/tunwarden.1")) {
      assertTrue(Files.size(home.resolve(file)) > 0, file);
    }
    try (Stream<Path> logs = Files.list(home.resolve("replay-logs"))) {
      assertTrue(logs.count() >= 2);
    }
    for (String launcher : List.of("bin/tunwarden", "bin/tunwarden.cmd")) {
      assertFalse(Files.readString(home.resolve(launcher)).contains("@version@"), launcher);
    }
  }

  @Test
  void everyLibraryHasItsLicenceNamed() throws IOException {
    String page = Files.readString(home.resolve("docs/licences.md"));
    try (Stream<Path> jars = Files.list(home.resolve("lib/lib"))) {
      for (Path jar : (Iterable<Path>) jars::iterator) {
        String library = jar.getFileName().toString().replaceFirst("-\\d.*", "");
        assertTrue(page.contains("| " + library + " | "), library);
      }
    }
  }

  @Test
  void theWindowsLauncherHasWindowsLineEnds() throws IOException {
    // Only its form is checked: no Windows was at hand to run it.
    byte[] bytes = Files.readAllBytes(home.resolve("bin/tunwarden.cmd"));
    String text = new String(bytes, StandardCharsets.US_ASCII);
    assertEquals(text.lines().count(), text.chars().filter(c -> c == '\r').count());
  }

  @Test
  void bashTakesTheCompletion() throws Exception {
    assumeTrue(Files.isExecutable(Path.of("/bin/bash")), "no bash here: completion not tried");
    Ran ran =
        run(
            false,
            "/bin/bash",
            "-c",
            "source '"
                + home.resolve("completion/tunwarden.bash")
                + "'; COMP_WORDS=(tunwarden reckon di); COMP_CWORD=2;"
                + " _complete_tunwarden; echo \"${COMPREPLY[@]}\"");
    assertEquals("dissolved", ran.out().strip());
  }

  /** On a terminal of its own, with the key that a person would press. */
  @Test
  void zshTakesTheCompletion() throws Exception {
    assumeTrue(Files.isExecutable(Path.of("/usr/bin/zsh")), "no zsh here: completion not tried");
    String script =
        """
        zmodload zsh/zpty
        zpty shell zsh -f -i
        zpty -w shell "PS1=; autoload -Uz compinit && compinit -u -D; source '%s'; echo rea''dy"
        zpty -r shell told '*ready*'
        zpty -w -n shell $'tunwarden reckon di\\t'
        for turn in {1..40}; do
          sleep 0.25
          while zpty -r -t shell part; do told+=$part; done
          [[ $told == *dissolved* ]] && break
        done
        print -r -- "$told"
        """
            .formatted(home.resolve("completion/tunwarden.bash"));
    assertTrue(run(false, "/usr/bin/zsh", "-f", "-c", script).out().contains("reckon dissolved"));
  }

  @Test
  void theManualPageHasNoFaults() throws Exception {
    assumeTrue(Files.isExecutable(Path.of("/usr/bin/groff")), "no groff here: manual not set");
    Ran ran =
        run(
            false,
            "/usr/bin/groff",
            "-man",
            "-Kutf8",
            "-Tutf8",
            "-ww",
            "-z",
            home.resolve("man/man1/tunwarden.1").toString());
    assertEquals("", ran.out());
  }
}

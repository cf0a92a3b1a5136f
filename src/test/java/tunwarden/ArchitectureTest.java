package tunwarden;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * The house rules: a package imports only packages above it in {@link #FLOORS}, the pure floor
 * touches neither clock nor disk nor thread, and each outside library lives in one place. A scan of
 * import lines backs the bytecode rules, which cannot see a constant that the compiler copied in.
 */
class ArchitectureTest {
  private static final Path SOURCES = Path.of("src/main/java/tunwarden");

  /** Every package, highest first; the same order as the table in DEVELOPERS.md. */
  private static final List<String> FLOORS =
      List.of(
          "units",
          "reading",
          "physics",
          "vessel",
          "estimate",
          "forecast",
          "assess",
          "alarm",
          "wire",
          "station",
          "serial",
          "replay",
          "rehearse",
          "journal",
          "notice",
          "serve",
          "screen",
          "report",
          "config",
          "app");

  private static final int PURE = FLOORS.indexOf("wire") + 1;

  private static final Pattern OURS = Pattern.compile("^tunwarden\\.(\\w+)");

  private static final Pattern IMPORT =
      Pattern.compile("^import (?:static )?tunwarden\\.(\\w+)\\b");

  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("tunwarden");

  @Test
  void everyPackageOnDiskIsAFloorAndEveryFloorIsOnDisk() throws IOException {
    try (Stream<Path> entries = Files.list(SOURCES)) {
      TreeSet<String> onDisk = new TreeSet<>();
      entries.filter(Files::isDirectory).forEach(p -> onDisk.add(p.getFileName().toString()));
      assertEquals(new TreeSet<>(FLOORS), onDisk);
    }
  }

  @Test
  void theDevelopersPageShowsTheSameHouse() throws IOException {
    Pattern row = Pattern.compile("\\| (?:pure|middle|edge|top) \\| `(\\w+)` \\|.*");
    List<String> documented = new ArrayList<>();
    for (String line : Files.readAllLines(Path.of("DEVELOPERS.md"))) {
      Matcher matcher = row.matcher(line);
      if (matcher.matches()) {
        documented.add(matcher.group(1));
      }
    }
    assertEquals(FLOORS, documented);
  }

  @Test
  void noPackageUsesOneBelowIt() {
    TreeSet<String> breaches = new TreeSet<>();
    for (JavaClass user : CLASSES) {
      for (Dependency use : user.getDirectDependenciesFromSelf()) {
        JavaClass used = use.getTargetClass();
        if (floorOf(used) > floorOf(user) && floorOf(user) >= 0) {
          breaches.add(user.getName() + " uses " + used.getName());
        }
      }
    }
    assertEquals(new TreeSet<>(), breaches);
  }

  /** Place in the house; -1 for what is not ours. */
  private static int floorOf(JavaClass type) {
    Matcher matcher = OURS.matcher(type.getPackageName());
    return matcher.find() ? FLOORS.indexOf(matcher.group(1)) : -1;
  }

  @Test
  void noImportLineNamesAPackageBelow() throws IOException {
    List<String> breaches = new ArrayList<>();
    try (Stream<Path> files = Files.walk(SOURCES)) {
      for (Path file : files.filter(f -> f.toString().endsWith(".java")).toList()) {
        int own = FLOORS.indexOf(SOURCES.relativize(file).getName(0).toString());
        for (String line : Files.readAllLines(file)) {
          Matcher matcher = IMPORT.matcher(line);
          if (own >= 0 && matcher.find() && FLOORS.indexOf(matcher.group(1)) > own) {
            breaches.add(file + ": " + line);
          }
        }
      }
    }
    assertEquals(List.of(), breaches);
  }

  @Test
  void subPackagesHaveNoCycles() {
    slices().matching("tunwarden.(**)").should().beFreeOfCycles().check(CLASSES);
  }

  @Test
  void thePureFloorTouchesNothingOutside() {
    noClasses()
        .that()
        .resideInAnyPackage(packages(FLOORS.subList(0, PURE)))
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "java.io..",
            "java.nio.file..",
            "java.nio.channels..",
            "java.net..",
            "java.util.concurrent..",
            "java.util.logging..",
            "org.slf4j..",
            "com.googlecode..",
            "com.fazecast..",
            "com.fasterxml..",
            "picocli..")
        .check(CLASSES);
    noClasses()
        .that()
        .resideInAnyPackage(packages(FLOORS.subList(0, PURE)))
        .should()
        .callMethod(System.class, "currentTimeMillis")
        .orShould()
        .callMethod(System.class, "nanoTime")
        .orShould()
        .callMethod(java.time.Instant.class, "now")
        .check(CLASSES);
  }

  @Test
  void theScreenSeesNoInstrumentNoDiskAndNoStation() {
    noClasses()
        .that()
        .resideInAPackage("tunwarden.screen..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage(
            "tunwarden.wire..",
            "tunwarden.station..",
            "tunwarden.serial..",
            "tunwarden.replay..",
            "tunwarden.rehearse..",
            "tunwarden.journal..",
            "tunwarden.notice..",
            "tunwarden.serve..",
            "java.nio.file..")
        .allowEmptyShould(true)
        .check(CLASSES);
  }

  @Test
  void outsideLibrariesLiveInOnePlaceEach() {
    only("com.googlecode.lanterna..", "tunwarden.screen.terminal..");
    only("org.jline..", "tunwarden.screen.terminal..");
    only("com.fazecast..", "tunwarden.serial..");
    only("picocli..", "tunwarden.app..");
    only("com.sun.jna..", "tunwarden.app.keeping..");
    only("jakarta.mail..", "tunwarden.notice..");
    only("io.prometheus..", "tunwarden.serve..");
  }

  private static void only(String library, String home) {
    noClasses()
        .that()
        .resideOutsideOfPackage(home)
        .should()
        .dependOnClassesThat()
        .resideInAPackage(library)
        .check(CLASSES);
  }

  private static String[] packages(List<String> floors) {
    return floors.stream().map(floor -> "tunwarden." + floor + "..").toArray(String[]::new);
  }
}

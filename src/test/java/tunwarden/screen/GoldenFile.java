package tunwarden.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Screens kept as text and compared cell by cell. After a change that was meant, run the tests with
 * {@code -Dscreens.record=true}, look at what changed in the files, and commit them.
 */
public final class GoldenFile {
  private static final Path FOLDER = Path.of("src/test/resources/screens");

  private GoldenFile() {}

  /** Compares with the file of that name; {@code record} writes it first. */
  public static void check(String name, String actual) throws IOException {
    Path file = FOLDER.resolve(name + ".txt");
    if (Boolean.getBoolean("screens.record")) {
      Files.createDirectories(FOLDER);
      Files.writeString(file, actual);
    }
    if (!Files.exists(file)) {
      fail(file + " is missing; record it and look at it");
    }
    assertEquals(Files.readString(file), actual, name);
  }
}

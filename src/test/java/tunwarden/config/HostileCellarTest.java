package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.config.profile.Profiles;
import tunwarden.units.BadInputException;

/**
 * Cellar files and device profiles that nobody wrote in good faith: refused, soon, in a sentence.
 */
class HostileCellarTest {
  private static final int DEEP = 5000;

  @TempDir private Path folder;

  private String refusal(byte[] content) throws IOException {
    Path file = folder.resolve("cellar.toml");
    Files.write(file, content);
    String words =
        assertTimeoutPreemptively(
            Duration.ofSeconds(30),
            () -> assertThrows(BadInputException.class, () -> CellarFile.read(file)).getMessage());
    assertFalse(words.chars().anyMatch(Character::isISOControl), "one plain line");
    return words;
  }

  private String refusal(String content) throws IOException {
    return refusal(content.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void aHugeFileIsRefused() throws IOException {
    assertTrue(refusal("# " + "x".repeat(2 << 20)).contains("larger than 1 MiB"));
  }

  @Test
  void deepNestingIsRefused() throws IOException {
    refusal("a = " + "[".repeat(DEEP) + "]".repeat(DEEP));
    refusal("a = " + "{ a = ".repeat(DEEP) + "1" + " }".repeat(DEEP));
    refusal("a" + ".a".repeat(DEEP) + " = 1");
    refusal("[a" + ".a".repeat(DEEP) + "]\nb = 1");
  }

  @Test
  void aHundredThousandKeysAreRefused() throws IOException {
    StringBuilder text = new StringBuilder("[site]\n");
    for (int i = 0; i < 100_000 && text.length() < 1_000_000; i++) {
      text.append("k").append(i).append("=1\n");
    }
    refusal(text.toString());
  }

  @Test
  void anOverlongTextIsRefused() throws IOException {
    refusal("[vessel.FV2]\ntitle = \"" + "x".repeat(500_000) + "\"");
  }

  @Test
  void bytesThatAreNoTextAreRefused() throws IOException {
    assertTrue(refusal(new byte[] {(byte) 0xff, 0, 1, (byte) 0xfe}).contains("UTF-8"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "[vessel.\"\\u001b[2J\"]\nvolume = \"1 L\"",
        "[vessel.\"../../etc\"]\nvolume = \"1 L\"",
        "[vessel.FV2]\nliquid = \"\\u001b]0;owned\\u0007\"",
        "[vessel.FV2]\n\"\\u001b[31m\" = 1"
      })
  void whatIsQuotedInARefusalIsHarmless(String text) throws IOException {
    assertFalse(refusal(text).contains("\u001b"));
  }

  @Test
  void aDeepOrHugeDeviceProfileIsRefused() throws IOException {
    Path devices = Files.createDirectories(folder.resolve("devices"));
    Files.writeString(devices.resolve("deep.json"), "{\"a\":".repeat(DEEP) + "1");
    Files.writeString(devices.resolve("huge.json"), " ".repeat(2 << 20) + "{}");
    Files.writeString(devices.resolve("array.json"), "[".repeat(100_000));
    for (String name : new String[] {"deep", "huge", "array", "../devices/deep", "/etc/passwd"}) {
      assertTimeoutPreemptively(
          Duration.ofSeconds(30),
          () -> assertThrows(BadInputException.class, () -> Profiles.find(name, folder)));
    }
  }
}

package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.pty.Pty;
import tunwarden.wire.profile.LineSettings;

/** Why a port cannot be opened, in a sentence that helps. */
class SerialLinksTest {
  private final SerialLinks links = new SerialLinks();
  @TempDir private Path folder;

  private PortException refused(String port) {
    return assertThrows(
        PortException.class, () -> links.open(port, LineSettings.USUAL, ByteLinkFactory.Use.ASK));
  }

  /** Error numbers of Linux, from errno.h. */
  @ParameterizedTest
  @CsvSource({
    "2, ABSENT, there is no serial port",
    "19, ABSENT, there is no serial port",
    "13, DENIED, dialout",
    "1, DENIED, dialout",
    "16, BUSY, held by another program",
    "11, BUSY, held by another program",
    "5, REFUSED, not a usable serial port"
  })
  void everyErrorNumberHasItsSentence(int code, PortException.Reason reason, String says) {
    Assumptions.assumeFalse(
        System.getProperty("os.name").startsWith("Windows"), "skipped: Linux error numbers");
    PortException refused = SerialLinks.refused("/dev/ttyUSB7", code);
    assertEquals(reason, refused.reason());
    assertTrue(refused.getMessage().contains(says), refused.getMessage());
    assertTrue(refused.getMessage().contains("/dev/ttyUSB7"));
  }

  @Test
  void aPortThatIsHeldIsBusy() throws Exception {
    try (Pty pty = Pty.plugged(folder);
        ByteLink held = links.open(pty.port(), LineSettings.USUAL, ByteLinkFactory.Use.ASK)) {
      assertEquals(0, held.read(new byte[8], 0));
      assertEquals(PortException.Reason.BUSY, refused(pty.port()).reason());
    }
  }

  @Test
  void whatIsAbsentOrNoPortIsRefused() throws Exception {
    Assumptions.assumeTrue(Files.exists(Path.of("/dev")), "skipped: needs device files");
    String absent = folder.resolve("ttyNONE").toString();
    assertEquals(PortException.Reason.ABSENT, refused(absent).reason());
    Path file = Files.writeString(folder.resolve("file"), "no port");
    assertEquals(PortException.Reason.REFUSED, refused(file.toString()).reason());
  }
}

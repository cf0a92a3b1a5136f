package tunwarden.serve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The status page in a real browser, as wide as a phone. */
class StatusPageInBrowserTest {
  private static final int PHONE_WIDTH = 500;
  private static final Path PICTURE = Path.of("target/status-page-phone.png");

  @TempDir private Path profile;

  @Test
  void aBrowserDrawsThePage() throws Exception {
    Optional<String> browser = browser();
    assumeTrue(browser.isPresent(), "skipped: no chromium on this computer");
    Files.deleteIfExists(PICTURE);
    ServeFixture fixture = new ServeFixture();
    try (Server server = fixture.server(Optional.empty())) {
      Process process =
          new ProcessBuilder(
                  browser.get(),
                  "--headless",
                  "--no-sandbox",
                  "--disable-gpu",
                  "--hide-scrollbars",
                  "--user-data-dir=" + profile,
                  "--window-size=" + PHONE_WIDTH + ",1900",
                  "--screenshot=" + PICTURE.toAbsolutePath(),
                  ServeFixture.uri(server, "/").toString())
              .redirectErrorStream(true)
              .start();
      String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
      assertTrue(process.waitFor(60, TimeUnit.SECONDS), out);
      assertTrue(Files.exists(PICTURE), out);
    }
    BufferedImage picture = ImageIO.read(PICTURE.toFile());
    assertEquals(PHONE_WIDTH, picture.getWidth());
    Set<Integer> colours = new HashSet<>();
    for (int y = 0; y < picture.getHeight(); y += 3) {
      for (int x = 0; x < picture.getWidth(); x += 3) {
        colours.add(picture.getRGB(x, y));
      }
    }
    assertTrue(colours.size() > 20, "text and ladder leave many shades, not " + colours.size());
  }

  private static Optional<String> browser() throws InterruptedException {
    for (String name : List.of("chromium", "chromium-browser", "google-chrome")) {
      try {
        Process process = new ProcessBuilder(name, "--version").redirectErrorStream(true).start();
        process.getInputStream().readAllBytes();
        if (process.waitFor(20, TimeUnit.SECONDS) && process.exitValue() == 0) {
          return Optional.of(name);
        }
      } catch (IOException absent) {
        continue;
      }
    }
    return Optional.empty();
  }
}

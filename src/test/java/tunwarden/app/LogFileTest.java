package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import ch.qos.logback.classic.LoggerContext;
import ch.qos.logback.classic.util.LogbackMDCAdapter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.ServiceLoader;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LogFileTest {
  @Test
  void theStateDirectoryFollowsThePlatform() {
    assertEquals(Path.of("/home/x/.local/state/tunwarden"), LogFile.directory(Map.of(), "/home/x"));
    assertEquals(
        Path.of("/s/tunwarden"), LogFile.directory(Map.of("XDG_STATE_HOME", "/s"), "/home/x"));
    assertEquals(
        Path.of("/w/Tunwarden"), LogFile.directory(Map.of("LOCALAPPDATA", "/w"), "/home/x"));
  }

  private static LoggerContext context() {
    LoggerContext context = new LoggerContext();
    context.setMDCAdapter(new LogbackMDCAdapter());
    return context;
  }

  @Test
  void logbackFindsItAsAService() {
    assertTrue(
        ServiceLoader.load(ch.qos.logback.classic.spi.Configurator.class).stream()
            .anyMatch(provider -> provider.type() == LogFile.class));
  }

  @Test
  void whatIsLoggedReachesTheFile(@TempDir Path folder) throws IOException {
    LoggerContext context = context();
    new LogFile(folder.resolve("tunwarden.log")).configure(context);
    context.getLogger("test").info("a gauge was plugged in");
    context.stop();
    String text = Files.readString(folder.resolve("tunwarden.log"));
    assertTrue(text.contains("INFO  test a gauge was plugged in"), text);
  }

  @Test
  void aFolderThatCannotBeMadeIsNoReasonToFail(@TempDir Path folder) throws IOException {
    Path file = Files.writeString(folder.resolve("in-the-way"), "");
    LoggerContext context = context();
    new LogFile(file.resolve("tunwarden.log")).configure(context);
    context.getLogger("test").info("lost");
    context.stop();
    assertFalse(Files.exists(file.resolve("tunwarden.log")));
  }
}

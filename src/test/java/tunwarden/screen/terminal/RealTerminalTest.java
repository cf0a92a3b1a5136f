package tunwarden.screen.terminal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

/**
 * The dashboard in a process of its own on a real pseudo-terminal, made by the {@code script}
 * command: on every way out the driver's settings are what they were and the shell's screen is
 * back.
 */
class RealTerminalTest {
  private static final String ENTER_SCREEN = "\u001b[?1049h";
  private static final String LEAVE_SCREEN = "\u001b[?1049l";
  private static final String SHOW_CURSOR = "\u001b[?25h";
  private static final Pattern SETTINGS = Pattern.compile("settings ([0-9a-f:]+)");
  private static final long PATIENCE_MS = 60_000;

  private Process process;
  private final ByteArrayOutputStream seen = new ByteArrayOutputStream();

  @AfterEach
  void endTheProcess() {
    if (process != null) {
      process.descendants().forEach(ProcessHandle::destroyForcibly);
      process.destroyForcibly();
    }
  }

  @Test
  void theLetterGivesTheTerminalBack() throws Exception {
    start("");
    type("q");
    type("y");
    checkGivenBack(0);
  }

  @Test
  void controlCGivesTheTerminalBackAndControlZAndSDoNoHarm() throws Exception {
    start("");
    type("\u001a\u0013\u001cv");
    waitFor("ladder");
    type("\u0003");
    checkGivenBack(0);
  }

  @Test
  void aTerminationSignalGivesTheTerminalBack() throws Exception {
    start("");
    ProcessHandle java =
        process
            .descendants()
            .filter(p -> p.info().command().orElse("").endsWith("java"))
            .findFirst()
            .orElseThrow();
    java.destroy();
    checkGivenBack(128 + 15);
  }

  @Test
  void anExceptionGivesTheTerminalBackBeforeItIsShown() throws Exception {
    start("-Dpreview.failAfter=8");
    checkGivenBack(1);
    String text = text();
    assertTrue(text.indexOf("the invented board broke") > text.lastIndexOf(LEAVE_SCREEN), text);
  }

  /** The adapter that a Windows console needs, on the only terminal there is here. */
  @Test
  void theConsoleAdapterTakesKeysAndGivesTheTerminalBack() throws Exception {
    start("-Dpreview.adapter=true");
    type("\u001b[B");
    type("\r");
    waitFor("[Vessel]");
    type("q");
    type("y");
    checkGivenBack(0);
  }

  private void start(String option) throws Exception {
    assumeTrue(
        Files.isExecutable(Path.of("/usr/bin/script")),
        "skipped: the script command of util-linux is not installed");
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    String run =
        java
            + " "
            + option
            + " -cp "
            + System.getProperty("java.class.path")
            + " "
            + TerminalPreview.class.getName();
    String line =
        "stty rows 24 cols 80; echo settings $(stty -g); "
            + run
            + "; code=$?; echo settings $(stty -g); echo code $code";
    process =
        new ProcessBuilder("/usr/bin/script", "-qec", line, "/dev/null")
            .redirectErrorStream(true)
            .start();
    Thread reader = new Thread(this::collect, "output of the pseudo-terminal");
    reader.setDaemon(true);
    reader.start();
    waitFor("3 vessels");
  }

  private void collect() {
    try (InputStream out = process.getInputStream()) {
      byte[] some = new byte[4096];
      for (int n = out.read(some); n >= 0; n = out.read(some)) {
        synchronized (seen) {
          seen.write(some, 0, n);
        }
      }
    } catch (IOException ended) {
      // The process is gone; what was seen is kept.
    }
  }

  private String text() {
    synchronized (seen) {
      return seen.toString(StandardCharsets.UTF_8);
    }
  }

  private void waitFor(String words) throws InterruptedException {
    for (long i = 0; i < PATIENCE_MS / 50 && !text().contains(words); i++) {
      Thread.sleep(50);
    }
    assertTrue(text().contains(words), "never saw '" + words + "' in: " + text());
  }

  private void type(String keys) throws IOException, InterruptedException {
    process.getOutputStream().write(keys.getBytes(StandardCharsets.UTF_8));
    process.getOutputStream().flush();
    Thread.sleep(300);
  }

  private void checkGivenBack(int code) throws InterruptedException {
    waitFor("code ");
    assertTrue(process.waitFor(PATIENCE_MS, TimeUnit.MILLISECONDS), text());
    String text = text();
    List<String> settings = SETTINGS.matcher(text).results().map(found -> found.group(1)).toList();
    assertEquals(2, settings.size(), text);
    assertEquals(
        withoutSpeed(settings.get(0)),
        withoutSpeed(settings.get(1)),
        "the driver's settings are what they were");
    int left = text.lastIndexOf(LEAVE_SCREEN);
    assertTrue(left > text.lastIndexOf(ENTER_SCREEN), "the shell's screen is back");
    assertTrue(left < text.lastIndexOf("settings "), "before the shell goes on");
    assertTrue(text.lastIndexOf(SHOW_CURSOR) > text.lastIndexOf(ENTER_SCREEN), "with its cursor");
    Matcher end = Pattern.compile("code (\\d+)").matcher(text);
    assertTrue(end.find());
    assertEquals(code, Integer.parseInt(end.group(1)));
  }

  /** JLine does not put back the line speed in the control flags, which means nothing here. */
  private static String withoutSpeed(String settings) {
    String[] words = settings.split(":", 4);
    return words[0] + ":" + words[1] + ":" + words[3];
  }
}

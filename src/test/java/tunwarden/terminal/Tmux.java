package tunwarden.terminal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Assumptions;

/** One terminal of a fixed size with a shell in it; keys in, screen out. */
final class Tmux implements AutoCloseable {
  private static final Duration PATIENCE = Duration.ofSeconds(45);

  private final String socket = "tunwarden-" + UUID.randomUUID();

  private Tmux() {}

  /** A terminal in that folder; skips the test where there is no tmux. */
  static Tmux open(int columns, int rows, Path folder) {
    Tmux tmux = new Tmux();
    Assumptions.assumeTrue(isInstalled(), "skipped: this test needs the package tmux");
    tmux.call(
        "-f",
        "/dev/null",
        "new-session",
        "-d",
        "-x",
        String.valueOf(columns),
        "-y",
        String.valueOf(rows),
        "-c",
        folder.toString(),
        "env LC_ALL=C.UTF-8 PS1='$ ' sh");
    return tmux;
  }

  private static boolean isInstalled() {
    try {
      return new ProcessBuilder("tmux", "-V").start().waitFor() == 0;
    } catch (IOException absent) {
      return false;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return false;
    }
  }

  /** Types a line and Enter. */
  void line(String text) {
    call("send-keys", "-l", text);
    call("send-keys", "Enter");
  }

  /** Presses keys by tmux's names: {@code q}, {@code Escape}, {@code C-c}. */
  void press(String... keys) {
    List<String> words = new ArrayList<>(List.of("send-keys"));
    words.addAll(List.of(keys));
    call(words.toArray(String[]::new));
  }

  void resize(int columns, int rows) {
    call("resize-window", "-x", String.valueOf(columns), "-y", String.valueOf(rows));
  }

  /** The text on the screen. */
  String screen() {
    return call("capture-pane", "-p");
  }

  /** Waits until the screen is as wished; fails with the screen when it never is. */
  String await(String wish, Predicate<String> wished) {
    long end = System.nanoTime() + PATIENCE.toNanos();
    String screen = screen();
    while (!wished.test(screen)) {
      if (System.nanoTime() > end) {
        Assertions.fail("never saw " + wish + "; the screen was:\n" + screen);
      }
      pause();
      screen = screen();
    }
    return screen;
  }

  String await(String text) {
    return await("'" + text + "'", screen -> screen.contains(text));
  }

  private static void pause() {
    try {
      TimeUnit.MILLISECONDS.sleep(100);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private String call(String... words) {
    List<String> command = new ArrayList<>(List.of("tmux", "-L", socket));
    command.addAll(List.of(words));
    try {
      Process process = new ProcessBuilder(command).redirectErrorStream(true).start();
      process.getOutputStream().close();
      String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
      process.waitFor();
      return out;
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return "";
    }
  }

  @Override
  public void close() {
    call("kill-server");
  }
}

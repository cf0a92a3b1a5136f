package tunwarden.notice;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.TimeUnit;

/**
 * Runs a program with its arguments as they stand, no shell between, and gives it the message as
 * JSON on standard input. The program has half a minute; another exit code than 0 is a failure.
 */
public final class CommandChannel implements Channel {
  private static final Duration LONGEST = Duration.ofSeconds(30);

  private final List<String> command;
  private final Duration longest;

  public CommandChannel(List<String> command) {
    this(command, LONGEST);
  }

  CommandChannel(List<String> command, Duration longest) {
    this.command = List.copyOf(command);
    this.longest = longest;
  }

  @Override
  public String name() {
    return "command";
  }

  @Override
  public void send(Message message) throws IOException {
    Process process =
        new ProcessBuilder(command)
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    try {
      feed(process, message.json().toString());
      if (!process.waitFor(longest.toMillis(), TimeUnit.MILLISECONDS)) {
        throw new IOException(command.get(0) + " did not end within " + longest.toSeconds() + " s");
      }
      if (process.exitValue() != 0) {
        throw new IOException(command.get(0) + " ended with code " + process.exitValue());
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IOException(command.get(0) + " was interrupted", e);
    } finally {
      process.descendants().forEach(ProcessHandle::destroyForcibly);
      process.destroyForcibly();
    }
  }

  /** A program that does not read its input is not held against it. */
  private static void feed(Process process, String json) {
    try (OutputStream in = process.getOutputStream()) {
      in.write(json.getBytes(StandardCharsets.UTF_8));
      in.write('\n');
    } catch (IOException notRead) {
      return;
    }
  }
}

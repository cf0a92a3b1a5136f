package tunwarden.serial;

import java.io.ByteArrayOutputStream;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.guess.TextGuess;
import tunwarden.wire.profile.LineSettings;

/** Opens a port for a look at what is on it, as a technician does. */
public final class Listening {
  /** Speeds tried in turn, the usual first: common practice, no source. */
  public static final List<Integer> BAUDS =
      List.of(9600, 19200, 38400, 57600, 115200, 4800, 2400, 1200);

  private static final int MOST_BYTES = 8192;

  private final ByteLinkFactory links;

  /** Listens through that factory. */
  public Listening(ByteLinkFactory links) {
    this.links = links;
  }

  /**
   * A guess that held.
   *
   * @param guess how the lines are framed
   * @param line the settings at which they were text
   */
  public record Heard(TextGuess guess, LineSettings line) {}

  /**
   * Listens at every usual speed until lines of text with numbers come.
   *
   * @param port name of the port
   * @param first settings to try first
   * @param each how long to listen at each speed
   * @throws PortException when the port cannot be used
   */
  public Optional<Heard> guess(String port, LineSettings first, Duration each)
      throws PortException {
    Optional<TextGuess> guess = TextGuess.at(capture(port, first, each));
    if (guess.isPresent()) {
      return Optional.of(new Heard(guess.get(), first));
    }
    for (int baud : BAUDS) {
      LineSettings line = first.atBaud(baud);
      guess = baud == first.baud() ? guess : TextGuess.at(capture(port, line, each));
      if (guess.isPresent()) {
        return Optional.of(new Heard(guess.get(), line));
      }
    }
    return Optional.empty();
  }

  /**
   * What comes in within that time.
   *
   * @throws PortException when the port cannot be used
   */
  public byte[] capture(String port, LineSettings line, Duration time) throws PortException {
    ByteArrayOutputStream heard = new ByteArrayOutputStream();
    byte[] buffer = new byte[512];
    long end = System.nanoTime() + time.toNanos();
    try (ByteLink link = links.open(port, line, ByteLinkFactory.Use.LISTEN)) {
      while (System.nanoTime() - end < 0 && heard.size() < MOST_BYTES) {
        heard.write(buffer, 0, link.read(buffer, 100));
      }
    }
    return heard.toByteArray();
  }

  /**
   * Asks one question once and waits for its answer.
   *
   * @throws PortException when the port cannot be used
   */
  public Result ask(String port, LineSettings line, Question question, Duration timeout)
      throws PortException {
    byte[] buffer = new byte[512];
    try (ByteLink link = links.open(port, line, ByteLinkFactory.Use.ASK)) {
      link.write(question.bytes());
      Question.Ear ear = question.listen();
      int onWire = question.bytes().length + question.answerBytes();
      long end = System.nanoTime() + line.nanosFor(onWire) + timeout.toNanos();
      while (System.nanoTime() - end < 0) {
        int left = (int) Math.max(1, (end - System.nanoTime()) / 1_000_000);
        int count = link.read(buffer, left);
        Result result = count > 0 ? ear.accept(buffer, count) : null;
        if (result != null) {
          return result;
        }
      }
      return ear.late();
    }
  }
}

package tunwarden.wire.text;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import tunwarden.reading.Quality;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.Profile;

/**
 * A text sent to an instrument that answers with one line.
 *
 * @param profile how it speaks
 * @param send what is sent, as the profile has it; {@code {slave}} stands for the address, {@code
 *     {slave:02}} for the address in two digits
 * @param slave the address, 0 for an instrument without one
 */
public record TextQuestion(Profile profile, String send, int slave) implements Question {
  private static final int USUAL_ANSWER = 32;
  private static final int SHOWN = 60;

  @Override
  public byte[] bytes() {
    return spoken().getBytes(StandardCharsets.ISO_8859_1);
  }

  private String spoken() {
    return send.replace("{slave}", String.valueOf(slave))
        .replace("{slave:02}", String.format(Locale.ROOT, "%02d", slave));
  }

  @Override
  public int answerBytes() {
    return USUAL_ANSWER;
  }

  @Override
  public Ear listen() {
    return new LineEar();
  }

  /** Takes the first line that speaks of the fields; an echo of the question is passed over. */
  private final class LineEar implements Ear {
    private final Framing framing = profile.framing();
    private final LineFramer framer = new LineFramer(framing.end(), true);
    private final LineReader reader = new LineReader(profile);
    private final String echo = spoken().strip();
    private String strange = "";

    @Override
    public Result accept(byte[] bytes, int count) {
      for (String line : framer.accept(bytes, count)) {
        if (line.equals(echo)) {
          continue;
        }
        LineReader.Line read = reader.read(line, send);
        if (read.verdict() == LineReader.Verdict.UNDERSTOOD) {
          return new Result.Values(read.values());
        }
        strange = line;
        if (read.verdict() == LineReader.Verdict.DAMAGED) {
          return new Result.Failure(Quality.CHECKSUM, Printable.of(line, SHOWN));
        }
      }
      return null;
    }

    @Override
    public Result.Failure late() {
      if (strange.isEmpty() && framer.pending() == 0 && framer.bytesDropped() == 0) {
        return new Result.Failure(Quality.NO_ANSWER, "nothing came");
      }
      String seen = strange.isEmpty() ? "no line end came" : Printable.of(strange, SHOWN);
      return new Result.Failure(Quality.UNREADABLE, seen);
    }
  }
}

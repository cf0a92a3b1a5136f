package tunwarden.wire.fuzz;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.config.profile.Profiles;
import tunwarden.units.Kind;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.guess.TextGuess;
import tunwarden.wire.modbus.Blocks;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.signal.Decoded;
import tunwarden.wire.simulate.PlayedInstrument;
import tunwarden.wire.text.Garble;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;
import tunwarden.wire.text.Printable;
import tunwarden.wire.text.TextQuestion;

/**
 * Every decoder against random bytes and against damaged messages of every shipped profile: no
 * exception, no hang, no growth, and nothing but finite values within their range comes out.
 */
class DecoderFuzzTest {
  private static final long SEED = 20261201;
  private static final int SLOWEST_MS = 2000;
  private static final int GUESS_EVERY = 500;
  private static final ThreadMXBean CPU = ManagementFactory.getThreadMXBean();

  private final List<Subject> subjects = new ArrayList<>();

  DecoderFuzzTest() {
    Profiles.SHIPPED.forEach(name -> subjects.add(new Subject(Profiles.find(name, Path.of("")))));
  }

  /** One profile with a message of its own and everything that decodes what it hears. */
  private static final class Subject {
    private final Profile profile;
    private final byte[] sound;
    private final List<Question> questions = new ArrayList<>();
    private final PlayedInstrument server;
    private final LineReader reader;
    private final LineFramer framer;
    private final Garble garble;

    Subject(Profile profile) {
      this.profile = profile;
      this.server = PlayedInstrument.of(profile, 7);
      profile
          .fields()
          .values()
          .forEach(
              f -> server.show(Map.of(f.name(), f.kind() == Kind.PRESSURE ? 90_000.0 : 278.0)));
      this.reader = new LineReader(profile);
      this.framer = new LineFramer(profile.framing().end(), false);
      this.garble = new Garble(profile.framing().end());
      List<Field> fields = List.copyOf(profile.fields().values());
      if (profile.speaks() == Speaks.MODBUS_RTU) {
        questions.addAll(Blocks.JOINED.questions(7, fields));
      } else if (profile.speaks() == Speaks.TEXT_QUERY) {
        fields.forEach(f -> questions.add(new TextQuestion(profile, f.number().send(), 7)));
      }
      byte[] asked = questions.isEmpty() ? new byte[0] : questions.get(0).bytes();
      byte[] said = server.speak();
      this.sound = said.length > 0 ? said : server.hear(asked, asked.length);
      assertTrue(sound.length > 0, profile::name);
    }

    void hear(byte[] bytes) {
      server.hear(bytes, bytes.length);
      garble.accept(bytes, bytes.length);
      garble.verdict();
      for (Question question : questions) {
        Question.Ear ear = question.listen();
        Result result = ear.accept(bytes, bytes.length);
        if (result instanceof Result.Values values) {
          check(values.values());
        }
        ear.late();
      }
      for (String line : framer.accept(bytes, bytes.length)) {
        check(reader.read(line, "").values());
      }
      assertTrue(framer.pending() <= LineFramer.CAP);
      assertTrue(Printable.of(bytes, bytes.length, 64).chars().allMatch(c -> c >= 32 && c < 127));
    }

    private void check(Map<String, Decoded> values) {
      values.forEach(
          (name, decoded) -> {
            Field.Trust trust = profile.field(name).orElseThrow().trust();
            assertTrue(
                decoded.isBad()
                    || (decoded.si() >= trust.lowSi() && decoded.si() <= trust.highSi()),
                () -> profile.name() + " " + decoded);
          });
    }
  }

  /** Random bytes, or the profile's own message with a few bytes changed, cut, or doubled. */
  private static byte[] input(SplittableRandom random, byte[] sound) {
    int way = random.nextInt(4);
    if (way == 0) {
      byte[] bytes = new byte[random.nextInt(1, 80)];
      random.nextBytes(bytes);
      return bytes;
    }
    byte[] bytes = sound.clone();
    for (int i = random.nextInt(1, 4); i > 0; i--) {
      int at = random.nextInt(bytes.length);
      bytes[at] = way == 1 ? (byte) (bytes[at] ^ 1 << random.nextInt(8)) : textByte(random);
    }
    if (way == 3) {
      bytes = Arrays.copyOf(bytes, random.nextInt(1, 2 * bytes.length));
    }
    return bytes;
  }

  private static byte textByte(SplittableRandom random) {
    String alphabet = "0123456789.,+-eE=;*$ \r\nPTNaInf?#\t\0";
    return alphabet.getBytes(StandardCharsets.ISO_8859_1)[random.nextInt(alphabet.length())];
  }

  private void fuzz(int inputs) {
    SplittableRandom random = new SplittableRandom(SEED);
    long slowest = 0;
    for (int i = 0; i < inputs; i++) {
      Subject subject = subjects.get(i % subjects.size());
      byte[] bytes = input(random, subject.sound);
      long start = CPU.getCurrentThreadCpuTime();
      try {
        subject.hear(bytes);
        if (i % GUESS_EVERY == 0) {
          TextGuess.at(bytes);
        }
      } catch (RuntimeException e) {
        throw new AssertionError(
            subject.profile.name()
                + " input "
                + i
                + " of seed "
                + SEED
                + ": "
                + Printable.of(bytes, bytes.length, 200),
            e);
      }
      slowest = Math.max(slowest, CPU.getCurrentThreadCpuTime() - start);
    }
    long ms = slowest / 1_000_000;
    assertTrue(ms < SLOWEST_MS, () -> "one input took " + ms + " ms of processor time");
  }

  @Test
  void decodersSurviveTwentyThousandInputs() {
    fuzz(20_000);
  }

  @Test
  @Tag("long")
  void decodersSurviveTenMillionInputs() {
    fuzz(10_000_000);
  }
}

package tunwarden.app.instruments;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import tunwarden.app.Ran;
import tunwarden.config.profile.ProfileReader;
import tunwarden.config.profile.Profiles;
import tunwarden.pty.Pty;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.simulate.PlayedInstrument;

/**
 * The {@code instruments} command, run in process, over pseudo-terminals where a port is needed.
 */
class InstrumentsCommandTest {
  @TempDir private Path folder;

  /** Does something to the instrument's side again and again while the body runs. */
  @SuppressWarnings("try")
  private Ran whilePlaying(Consumer<Pty> instrument, String... args) {
    try (Pty pty = Pty.plugged(folder)) {
      Thread playing =
          new Thread(
              () -> {
                while (!Thread.currentThread().isInterrupted()) {
                  instrument.accept(pty);
                }
              });
      playing.start();
      try {
        for (int i = 0; i < args.length; i++) {
          args[i] = args[i].replace("PORT", pty.port());
        }
        return Ran.tunwarden(args);
      } finally {
        playing.interrupt();
        join(playing);
      }
    }
  }

  private static void join(Thread thread) {
    try {
      thread.join(2000);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void pause(int ms) {
    try {
      Thread.sleep(ms);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void answer(Pty pty, PlayedInstrument instrument) {
    byte[] heard = pty.receive(20);
    byte[] answer = instrument.hear(heard, heard.length);
    if (answer.length > 0) {
      pty.send(answer);
    }
  }

  static java.util.List<String> shipped() {
    return Profiles.SHIPPED;
  }

  @Test
  void everyShippedProfileIsListedAndCanBePrinted() {
    String list = Ran.tunwarden("instruments", "list", folder.toString()).ok();
    for (String name : Profiles.SHIPPED) {
      assertTrue(list.contains(name), name);
      String printed = Ran.tunwarden("instruments", "list", "--print", name).ok();
      assertEquals(name, ProfileReader.read(printed, name).name());
    }
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void checkShowsAnExchangeThatIsReadBack(String name) {
    String said = Ran.tunwarden("instruments", "check", name).ok();
    assertTrue(said.contains("read as"), said);
    assertTrue(said.endsWith("no fault found\n") || said.endsWith("no fault found\r\n"), said);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "\"unit\": \"bar\"|\"unit\": \"barr\"|fields.P.unit",
        "\"baud\": 9600|\"baud\": 9600.5|line.baud",
        "\"measures\"|\"mesures\"|fields.P.mesures",
        "\"10 bar\"|\"-2 bar\"|fields.P.range must rise",
        "\"10 bar\"|\"11 bara\"|fields.P.range",
        "\"speaks\": \"text-lines\"|\"speaks\": \"morse\"|modbus-rtu, text-lines, text-query",
        "\"10 mbar\"|\"10\"|fields.P.accuracy",
        "\"period\": \"1 s\"|\"period\": \"1 s\", \"period\": \"2 s\"|line 8",
        "\"key\": \"P\"|\"column\": 1|fields.P.key is missing",
        "\"fields\"|\"felds\"|felds is not known here",
      })
  void aWrongProfileIsRefusedInOneSentence(String right, String wrong, String says)
      throws IOException {
    Path file = folder.resolve("gauge.json");
    String text = Profiles.shippedText("text-line");
    assertTrue(text.contains(right), right);
    Files.writeString(file, text.replaceFirst(java.util.regex.Pattern.quote(right), wrong));
    String refused = Ran.tunwarden("instruments", "check", file.toString()).refused();
    assertTrue(refused.contains(says) && refused.contains("gauge.json"), refused);
  }

  @Test
  void portsAndWrongNamesAreAnswered() {
    assertTrue(!Ran.tunwarden("instruments", "ports").ok().isBlank());
    String none = folder.resolve("nothing").toString();
    String refused = Ran.tunwarden("instruments", "listen", none, "--for", "1 s").refused();
    assertTrue(refused.contains("no serial port " + none), refused);
    assertTrue(
        Ran.tunwarden("instruments", "check", "no-such-gauge").refused().contains("text-line"));
  }

  @Test
  void listenShowsLinesAndWhatTheProfilesReadInThem() {
    Ran ran =
        whilePlaying(
            pty -> {
              pty.send("P=0.873 T=5.25\n\033]0;owned\007hello\n");
              pause(50);
            },
            "instruments",
            "listen",
            "PORT",
            "--for",
            "700 ms");
    String out = ran.ok();
    assertTrue(out.contains("text-line: P = 0.8730 bar gauge, T = 5.25 °C"), out);
    assertTrue(out.contains("<1b>]0;owned<07>hello"), out);
    assertTrue(out.contains("no profile reads this line"), out);
    assertTrue(out.indexOf('\033') < 0);
  }

  @Test
  void listenByAProfileAsksAndPrintsValues() {
    Profile profile = Profiles.find("modbus-rtu-scaled", folder);
    PlayedInstrument instrument = PlayedInstrument.of(profile, 9);
    instrument.show(java.util.Map.of("pressure", 87_300.0, "temperature", 278.4));
    Ran ran =
        whilePlaying(
            pty -> answer(pty, instrument),
            "instruments",
            "listen",
            "PORT",
            "--device",
            "modbus-rtu-scaled",
            "--address",
            "9",
            "--for",
            "2500 ms");
    assertEquals(0, ran.code(), ran.out());
    assertTrue(ran.ok().contains("pressure  0.8730 bar gauge"), ran.out());
    assertTrue(ran.out().contains("temperature  5.25 °C"), ran.out());
  }

  @Test
  void aGuessIsAProfileThatReadsTheLine() throws IOException {
    Ran ran =
        whilePlaying(
            pty -> {
              pty.send("temp:5,25 C; druck:873,5 mbar\r\n");
              pause(50);
            },
            "instruments",
            "listen",
            "PORT",
            "--guess",
            "--for",
            "700 ms");
    assertEquals(0, ran.code(), ran.err());
    Path file = folder.resolve("guess.json");
    Files.writeString(file, ran.out());
    String check = Ran.tunwarden("instruments", "check", file.toString()).ok();
    assertTrue(check.contains("druck") && check.contains("temp"), check);
  }

  @Test
  void probePrintsEveryInterpretation() {
    Profile profile = Profiles.find("modbus-rtu-float", folder);
    PlayedInstrument instrument = PlayedInstrument.of(profile, 1);
    instrument.show(java.util.Map.of("pressure", 100_000.0, "temperature", 278.4));
    Ran ran =
        whilePlaying(
            pty -> answer(pty, instrument), "instruments", "probe", "PORT", "--timeout", "2 s");
    String out = ran.ok();
    assertTrue(out.contains("register     0  3f 80"), out);
    assertTrue(out.matches("(?s).*high-first +float32 1\\.000000 .*"), out);
    Ran draft =
        whilePlaying(
            pty -> answer(pty, instrument),
            "instruments",
            "probe",
            "PORT",
            "--timeout",
            "2 s",
            "--draft");
    assertTrue(draft.out().contains("\"words\" : \"high-first\""), draft.out());
    ProfileReader.read(draft.out(), "draft");
  }

  @Test
  void probeOfSilenceFails() {
    Ran ran = whilePlaying(pty -> pause(20), "instruments", "probe", "PORT", "--timeout", "200 ms");
    assertEquals(1, ran.code());
    assertTrue(ran.err().contains("does not answer"), ran.err());
    assertTrue(
        Ran.tunwarden("instruments", "probe", "x", "--function", "6").refused().contains("3 or 4"));
  }
}

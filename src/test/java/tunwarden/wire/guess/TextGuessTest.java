package tunwarden.wire.guess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.config.profile.ProfileDraft;
import tunwarden.config.profile.ProfileReader;
import tunwarden.config.profile.Profiles;
import tunwarden.units.Kind;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.signal.Decoded;
import tunwarden.wire.simulate.PlayedInstrument;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;

/** A guessed profile reads the very lines it was guessed from. */
class TextGuessTest {
  private static Map<String, Decoded> readByGuess(String stream) {
    byte[] heard = stream.getBytes(StandardCharsets.ISO_8859_1);
    TextGuess guess = TextGuess.at(heard).orElseThrow();
    String draft = ProfileDraft.of(guess, LineSettings.USUAL);
    Profile profile = ProfileReader.read(draft, "draft");
    LineFramer framer = new LineFramer(profile.framing().end(), false);
    String line = framer.accept(heard, heard.length).get(0);
    return new LineReader(profile).read(line, "").values();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "P=0.873 T=5.25;|P|T",
        "press: 0.873 bar, temp: 5.25 C;|press|temp",
        "T:+5,25 P:0,873;|P|T",
        "p=873.0mbar|p|",
        "0.873 bar;5.25 C|column-1|column-2",
        "7, 87.3 kPa, 5.25 C, ok|column-2|column-3",
        "0.873 5.25|column-1|column-2",
      })
  void aLineIsReadByItsGuess(String line, String pressure, String temperature) {
    Map<String, Decoded> values = readByGuess("73 x\r\n" + (line + "\r\n").repeat(3));
    assertEquals(87_300, values.get(pressure).si(), 1e-6, values::toString);
    if (temperature != null) {
      assertEquals(278.4, values.get(temperature).si(), 1e-6, values::toString);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"text-line", "checksummed-line", "checksummed-line-crc"})
  void shippedStreamsAreGuessed(String name) {
    Profile profile = Profiles.find(name, Path.of(""));
    PlayedInstrument instrument = PlayedInstrument.of(profile, 0);
    ByteArrayOutputStream stream = new ByteArrayOutputStream();
    for (int i = 0; i < 5; i++) {
      double pascal = 87_300 + 100 * i;
      profile
          .fields()
          .values()
          .forEach(f -> assertTrue(f.kind() == Kind.PRESSURE || f.kind() == Kind.TEMPERATURE));
      instrument.show(
          Map.of(
              "P", pascal, "T", 278.4, "B", 101_325.0, "pressure", pascal, "temperature", 278.4));
      stream.writeBytes(instrument.speak());
    }
    TextGuess guess = TextGuess.at(stream.toByteArray()).orElseThrow();
    assertEquals(profile.framing().check(), guess.framing().check());
    assertEquals(profile.framing().layout(), guess.framing().layout());
    Map<String, Decoded> values =
        readByGuess(new String(stream.toByteArray(), StandardCharsets.ISO_8859_1));
    assertTrue(values.values().stream().anyMatch(v -> Math.abs(v.si() - 87_400) < 1), name);
  }

  @Test
  void noiseIsNotGuessedAt() {
    SplittableRandom random = new SplittableRandom(11);
    for (int i = 0; i < 200; i++) {
      byte[] noise = new byte[400];
      random.nextBytes(noise);
      TextGuess.at(noise)
          .ifPresent(g -> ProfileReader.read(ProfileDraft.of(g, LineSettings.USUAL), "draft"));
    }
    assertTrue(TextGuess.at(new byte[0]).isEmpty());
    assertTrue(TextGuess.at("one line only\n".getBytes(StandardCharsets.US_ASCII)).isEmpty());
  }
}

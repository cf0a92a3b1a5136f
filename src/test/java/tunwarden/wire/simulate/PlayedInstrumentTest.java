package tunwarden.wire.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tunwarden.config.profile.Profiles;
import tunwarden.units.Kind;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.modbus.Blocks;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.signal.Decoded;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;
import tunwarden.wire.text.TextQuestion;

/** Every shipped profile is played and read back. */
class PlayedInstrumentTest {
  static List<String> shipped() {
    return Profiles.SHIPPED;
  }

  private static Map<String, Double> values(Profile profile) {
    Map<String, Double> values = new HashMap<>();
    for (Field field : profile.fields().values()) {
      values.put(field.name(), field.kind() == Kind.PRESSURE ? 98_000.0 : 278.4);
    }
    return values;
  }

  private static Map<String, Decoded> read(Profile profile, PlayedInstrument instrument) {
    if (profile.speaks() == Speaks.TEXT_LINES) {
      byte[] said = instrument.speak();
      char end = profile.framing().end();
      List<String> lines = new LineFramer(end, true).accept(said, said.length);
      return new LineReader(profile).read(lines.get(0), "").values();
    }
    Map<String, Decoded> values = new LinkedHashMap<>();
    for (Question question : questions(profile)) {
      byte[] asked = question.bytes();
      byte[] answer = instrument.hear(asked, asked.length);
      Result result = question.listen().accept(answer, answer.length);
      values.putAll(((Result.Values) result).values());
    }
    return values;
  }

  private static List<? extends Question> questions(Profile profile) {
    List<Field> fields = List.copyOf(profile.fields().values());
    if (profile.speaks() == Speaks.MODBUS_RTU) {
      return Blocks.JOINED.questions(7, fields);
    }
    return fields.stream().map(f -> new TextQuestion(profile, f.number().send(), 7)).toList();
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void whatIsShownIsRead(String name) {
    Profile profile = Profiles.find(name, Path.of(""));
    PlayedInstrument instrument = PlayedInstrument.of(profile, 7);
    Map<String, Double> shown = values(profile);
    instrument.show(shown);
    Map<String, Decoded> read = read(profile, instrument);
    assertEquals(shown.keySet(), read.keySet());
    for (Field field : profile.fields().values()) {
      double tolerance = field.kind() == Kind.PRESSURE ? 51 : 0.03;
      assertEquals(shown.get(field.name()), read.get(field.name()).si(), tolerance, field::name);
    }
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void whatIsMissingIsReadAsAFaultAndNeverAsANumber(String name) {
    Profile profile = Profiles.find(name, Path.of(""));
    PlayedInstrument instrument = PlayedInstrument.of(profile, 7);
    instrument.show(Map.of());
    Map<String, Decoded> read = read(profile, instrument);
    assertEquals(profile.fields().keySet(), read.keySet());
    read.values().forEach(decoded -> assertTrue(decoded.isBad(), decoded::toString));
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void aQuestionToAnotherAddressOrNoiseIsNotAnswered(String name) {
    PlayedInstrument instrument = PlayedInstrument.of(Profiles.find(name, Path.of("")), 7);
    byte[] noise = "#08?\rMEAS\n\001\003".getBytes(StandardCharsets.ISO_8859_1);
    for (int i = 0; i < 200; i++) {
      assertEquals(0, instrument.hear(noise, noise.length).length);
    }
  }
}

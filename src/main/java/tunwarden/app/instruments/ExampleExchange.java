package tunwarden.app.instruments;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.modbus.Blocks;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.signal.Decoded;
import tunwarden.wire.simulate.PlayedInstrument;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;
import tunwarden.wire.text.Printable;
import tunwarden.wire.text.TextQuestion;

/** What would go over the wire with an instrument of a profile, played at a third of its ranges. */
final class ExampleExchange {
  private static final int UNIT = 1;
  private static final int SHOWN = 120;

  private final Profile profile;
  private final PlayedInstrument instrument;
  private final List<String> lines = new ArrayList<>();

  private ExampleExchange(Profile profile) {
    this.profile = profile;
    this.instrument = PlayedInstrument.of(profile, UNIT);
    Map<String, Double> values = new HashMap<>();
    for (Field field : profile.fields().values()) {
      double low = field.trust().lowSi();
      values.put(field.name(), low + (field.trust().highSi() - low) / 3);
    }
    instrument.show(values);
  }

  static List<String> lines(Profile profile) {
    ExampleExchange example = new ExampleExchange(profile);
    if (profile.speaks() == Speaks.TEXT_LINES) {
      example.stream();
    } else {
      example.questions().forEach(example::exchange);
    }
    return example.lines;
  }

  private void stream() {
    byte[] said = instrument.speak();
    LineFramer framer = new LineFramer(profile.framing().end(), true);
    LineReader reader = new LineReader(profile);
    lines.add("it sends  " + shown(said));
    for (String line : framer.accept(said, said.length)) {
      lines.add("read as   " + words(profile, reader.read(line, "").values()));
    }
  }

  private List<Question> questions() {
    List<Field> fields = List.copyOf(profile.fields().values());
    if (profile.speaks() == Speaks.MODBUS_RTU) {
      return List.copyOf(Blocks.JOINED.questions(UNIT, fields));
    }
    LinkedHashSet<Question> asked = new LinkedHashSet<>();
    fields.forEach(field -> asked.add(new TextQuestion(profile, field.number().send(), UNIT)));
    return List.copyOf(asked);
  }

  private void exchange(Question question) {
    byte[] asked = question.bytes();
    byte[] answer = instrument.hear(asked, asked.length);
    lines.add("asked     " + shown(asked));
    lines.add("answered  " + shown(answer));
    if (question.listen().accept(answer, answer.length) instanceof Result.Values values) {
      lines.add("read as   " + words(profile, values.values()));
    }
  }

  private String shown(byte[] bytes) {
    boolean binary = profile.speaks() == Speaks.MODBUS_RTU;
    return binary
        ? Printable.hex(bytes, bytes.length, SHOWN)
        : Printable.of(bytes, bytes.length, SHOWN);
  }

  /** Values in words, each with its field. */
  static String words(Profile profile, Map<String, Decoded> values) {
    List<String> words = new ArrayList<>();
    values.forEach(
        (name, decoded) -> {
          Field field = profile.field(name).orElseThrow();
          String bad = decoded.quality().why() + " (" + decoded.detail() + ")";
          words.add(name + " = " + (decoded.isBad() ? bad : Measure.words(decoded.si(), field)));
        });
    return String.join(", ", words);
  }
}

package tunwarden.wire.simulate;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.Place;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.text.Checks;
import tunwarden.wire.text.TextQuestion;

/** Plays an instrument that speaks text, unasked or asked. */
final class PlayedText implements PlayedInstrument {
  private static final byte[] NOTHING = {};
  private static final int CAP = 256;

  private final Profile profile;
  private final Framing framing;
  private final int slave;
  private final StringBuilder heard = new StringBuilder();
  private Map<String, Double> values = Map.of();

  PlayedText(Profile profile, int slave) {
    this.profile = profile;
    this.framing = profile.framing();
    this.slave = slave;
  }

  @Override
  public void show(Map<String, Double> next) {
    values = Map.copyOf(next);
  }

  @Override
  public byte[] speak() {
    return profile.speaks() == Speaks.TEXT_LINES ? line("") : NOTHING;
  }

  @Override
  public byte[] hear(byte[] bytes, int count) {
    if (profile.speaks() != Speaks.TEXT_QUERY) {
      return NOTHING;
    }
    heard.append(new String(bytes, 0, count, StandardCharsets.ISO_8859_1));
    for (Field field : profile.fields().values()) {
      String sent = field.number().send();
      byte[] question = new TextQuestion(profile, sent, slave).bytes();
      String spoken = new String(question, StandardCharsets.ISO_8859_1);
      if (heard.toString().endsWith(spoken)) {
        heard.setLength(0);
        return line(sent);
      }
    }
    heard.delete(0, Math.max(0, heard.length() - CAP));
    return NOTHING;
  }

  private byte[] line(String sent) {
    List<String> cells = new ArrayList<>();
    for (Field field : profile.fields().values()) {
      if (!field.number().send().equals(sent)) {
        continue;
      }
      if (field.place() instanceof Place.Key key) {
        cells.add(key.key() + framing.joinedBy() + number(field));
      } else if (field.place() instanceof Place.Column column) {
        while (cells.size() < column.number()) {
          cells.add("");
        }
        cells.set(column.number() - 1, number(field));
      }
    }
    String body = framing.start() + String.join(framing.between().substring(0, 1), cells);
    return (Checks.prove(body, framing.check()) + framing.end())
        .getBytes(StandardCharsets.ISO_8859_1);
  }

  private String number(Field field) {
    Double si = values.get(field.name());
    Field.Number number = field.number();
    if (si == null || !Double.isFinite(si)) {
      if (!number.faultWords().isEmpty()) {
        return number.faultWords().get(0);
      }
      return number.faultNumbers().isEmpty() ? "ERR" : number.faultNumbers().get(0).toString();
    }
    String text = String.format(Locale.ROOT, "%.6f", Measure.raw(si, field));
    return (framing.decimalComma() ? text.replace('.', ',') : text) + number.suffix();
  }
}

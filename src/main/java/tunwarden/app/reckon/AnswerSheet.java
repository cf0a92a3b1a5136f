package tunwarden.app.reckon;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.units.Unit;

/**
 * One answer: main values with their 95 % uncertainty, the model, the cautions. The text is in the
 * units the person chose, the JSON always in the unit that ends its key. Values are given in SI.
 */
final class AnswerSheet {
  private static final MathContext DIGITS = new MathContext(7);
  private static final int MOST_DECIMALS = 9;
  private static final int LABEL = 15;
  private static final int WIDTH = 79;

  private final Display display;
  private final Map<String, Object> values = new LinkedHashMap<>();
  private final List<String[]> lines = new ArrayList<>();
  private final Set<String> assumptions = new LinkedHashSet<>();
  private final Set<String> cautions = new LinkedHashSet<>();
  private String model = "";
  private boolean no;

  AnswerSheet(Display display) {
    this.display = display;
  }

  Display display() {
    return display;
  }

  /** A pressure, Pa gauge; the key ends in {@code _bar_g}. */
  void gauge(String key, String label, double paGauge, double u95Pa) {
    json(key, Unit.BAR.differenceFromSi(paGauge), Unit.BAR.differenceFromSi(u95Pa));
    line(label, spread(display.pressureNumber(paGauge), u95Pa) + pressureUnit() + " g");
  }

  /** A pressure, Pa absolute; the key ends in {@code _bar_a}. */
  void absolute(String key, String label, double paAbsolute, double u95Pa) {
    json(key, Unit.BAR.differenceFromSi(paAbsolute), Unit.BAR.differenceFromSi(u95Pa));
    line(label, spread(display.pressureNumber(paAbsolute), u95Pa) + pressureUnit() + " absolute");
  }

  /** A difference of pressures, Pa; the key ends in {@code _bar}. */
  void difference(String key, String label, double pa, double u95Pa) {
    json(key, Unit.BAR.differenceFromSi(pa), Unit.BAR.differenceFromSi(u95Pa));
    line(label, spread(display.signedPressureNumber(pa), u95Pa) + pressureUnit());
  }

  /** A temperature, K; the key ends in {@code _c}. */
  void temperature(String key, String label, double kelvin, double u95K) {
    json(key, Unit.CELSIUS.fromSi(kelvin), u95K);
    Unit unit = display.temperature();
    String value = Display.number(unit.fromSi(kelvin), 1);
    String u95 = Display.number(unit.differenceFromSi(u95K), 1);
    line(label, value + " ± " + u95 + " °" + unit.symbol());
  }

  /** Dissolved CO2, kg/m³, which is g/L and what the key ends in. */
  void content(String key, String label, double kgPerM3, double u95KgPerM3) {
    json(key, kgPerM3, u95KgPerM3);
    Unit other = display.gasContent() == Unit.VOLUMES ? Unit.GRAM_PER_LITRE : Unit.VOLUMES;
    line(
        label,
        display.gasContentNumber(kgPerM3)
            + " ± "
            + display.gasContentNumber(u95KgPerM3)
            + " "
            + display.gasContent().symbol()
            + " ("
            + Display.number(other.fromSi(kgPerM3), 2)
            + " "
            + other.symbol()
            + ")");
  }

  /** A number in the unit that the key ends in. */
  void number(String key, String label, double value, double u95, String unit) {
    json(key, value, u95);
    int decimals = decimalsOf(u95 > 0 ? u95 : value);
    String text = Display.number(value, decimals) + " ± " + Display.number(u95, decimals);
    line(label, text + " " + unit);
  }

  /** A value that there is none of: JSON null, and the reason as text. */
  void none(String key, String label, String reason) {
    values.put(key, null);
    line(label, reason);
  }

  /** A bare value of the JSON: number, text, truth, list or map, with a line of its own. */
  void plain(String key, Object value, String label, String text) {
    values.put(key, value);
    line(label, text);
  }

  /** A value of the JSON with its uncertainty and no line of text. */
  void json(String key, double value, double u95) {
    values.put(key, value);
    values.put("u95_" + key, u95);
  }

  /** A bare value of the JSON without a line of text. */
  void hidden(String key, Object value) {
    values.put(key, value);
  }

  /** A line of text that has no value in the JSON. */
  void line(String label, String text) {
    lines.add(new String[] {label, text});
  }

  /** The question was one of yes or no, and the answer is no. */
  void no() {
    no = true;
  }

  boolean isNo() {
    return no;
  }

  /** The correlations used. */
  void model(String words) {
    model = words;
  }

  /** What the answer rests on, one sentence without its full stop, quantities metric. */
  void assume(String sentence) {
    assumptions.add(sentence);
  }

  /** Something to mind before acting on the answer, quantities metric. */
  void caution(String sentence) {
    cautions.add(sentence);
  }

  void printText(PrintWriter out) {
    lines.forEach(line -> print(out, line[0], line[1]));
    print(out, "model", model);
    String label = "assumes";
    for (String sentence : assumptions) {
      print(out, label, InUnits.of(sentence, display));
      label = "";
    }
    cautions.forEach(sentence -> print(out, "caution", InUnits.of(sentence, display)));
  }

  void printJson(PrintWriter out) {
    StringWriter text = new StringWriter();
    JsonFactory factory = JsonFactory.builder().enable(JsonWriteFeature.ESCAPE_NON_ASCII).build();
    try (JsonGenerator json = factory.createGenerator(text)) {
      DefaultPrettyPrinter printer = new DefaultPrettyPrinter();
      printer.indentArraysWith(DefaultIndenter.SYSTEM_LINEFEED_INSTANCE);
      json.setPrettyPrinter(printer);
      json.writeStartObject();
      for (Map.Entry<String, Object> entry : values.entrySet()) {
        json.writeFieldName(entry.getKey());
        write(json, entry.getValue());
      }
      json.writeStringField("model", model);
      writeTexts(json, "assumptions", assumptions);
      writeTexts(json, "cautions", cautions);
      json.writeEndObject();
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    out.println(text);
  }

  private static void writeTexts(JsonGenerator json, String key, Set<String> texts)
      throws IOException {
    json.writeArrayFieldStart(key);
    for (String text : texts) {
      json.writeString(text);
    }
    json.writeEndArray();
  }

  private static void write(JsonGenerator json, Object value) throws IOException {
    if (value instanceof Boolean truth) {
      json.writeBoolean(truth);
    } else if (value instanceof Number number && Double.isFinite(number.doubleValue())) {
      json.writeNumber(
          BigDecimal.valueOf(number.doubleValue())
              .round(DIGITS)
              .stripTrailingZeros()
              .toPlainString());
    } else if (value instanceof String text) {
      json.writeString(text);
    } else if (value instanceof List<?> list) {
      json.writeStartArray();
      for (Object each : list) {
        write(json, each);
      }
      json.writeEndArray();
    } else if (value instanceof Map<?, ?> map) {
      json.writeStartObject();
      for (Map.Entry<?, ?> entry : map.entrySet()) {
        json.writeFieldName(entry.getKey().toString());
        write(json, entry.getValue());
      }
      json.writeEndObject();
    } else {
      json.writeNull();
    }
  }

  private String spread(String value, double u95Pa) {
    return value + " ± " + display.pressureNumber(u95Pa) + " ";
  }

  private String pressureUnit() {
    return display.pressure().symbol();
  }

  /** Decimals that show two significant digits. */
  private static int decimalsOf(double value) {
    if (value == 0 || !Double.isFinite(value)) {
      return 0;
    }
    int decimals = 1 - (int) Math.floor(Math.log10(Math.abs(value)));
    return Math.max(0, Math.min(MOST_DECIMALS, decimals));
  }

  private static void print(PrintWriter out, String label, String text) {
    StringBuilder line = new StringBuilder(label + " ".repeat(Math.max(1, LABEL - label.length())));
    for (String word : text.split(" ")) {
      boolean full = line.length() > LABEL && line.length() + word.length() >= WIDTH;
      if (full) {
        out.println(line);
        line = new StringBuilder(" ".repeat(LABEL));
      }
      line.append(line.length() > LABEL ? " " : "").append(word);
    }
    out.println(line.toString().stripTrailing());
  }
}

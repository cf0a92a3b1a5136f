package tunwarden.config.profile;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Locale;
import tunwarden.units.Kind;
import tunwarden.wire.guess.Cell;
import tunwarden.wire.guess.TextGuess;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.WordOrder;

/** Writes a first draft of a device profile from a guess; range and accuracy are for people. */
public final class ProfileDraft {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  private ProfileDraft() {}

  /** A profile for lines of text. */
  public static String of(TextGuess guess, LineSettings line) {
    ObjectNode root = root("text-lines", line);
    Framing framing = guess.framing();
    ObjectNode frame = root.putObject("framing");
    frame.put("end", String.valueOf(framing.end()));
    if (!framing.start().isEmpty()) {
      frame.put("start", framing.start());
    }
    frame.put("layout", framing.layout().name().toLowerCase(Locale.ROOT));
    frame.put("between", framing.between());
    if (framing.layout() == Framing.Layout.PAIRS) {
      frame.put("joined-by", String.valueOf(framing.joinedBy()));
    }
    if (framing.decimalComma()) {
      frame.put("decimal", "comma");
    }
    frame.put("check", framing.check().word());
    root.put("period", "1 s");
    ObjectNode fields = root.putObject("fields");
    for (Cell cell : guess.cells()) {
      boolean pairs = framing.layout() == Framing.Layout.PAIRS;
      ObjectNode field = fields.putObject(pairs ? cell.name() : "column-" + cell.name());
      measure(field, cell.kind().orElseThrow(), cell.unit());
      if (pairs) {
        field.put("key", cell.name());
      } else {
        field.put("column", Integer.parseInt(cell.name()));
      }
      if (!cell.suffix().isEmpty()) {
        field.put("suffix", cell.suffix());
      }
    }
    return text(root);
  }

  /** A profile for a transmitter with two floating-point or two whole values from an address. */
  public static String ofRegisters(
      int function, int address, boolean real, WordOrder order, LineSettings line) {
    ObjectNode root = root("modbus-rtu", line);
    root.put("period", "1 s");
    root.put("timeout", "150 ms");
    ObjectNode fields = root.putObject("fields");
    String[] names = {"pressure", "temperature"};
    for (int i = 0; i < names.length; i++) {
      ObjectNode field = fields.putObject(names[i]);
      ObjectNode register = field.putObject("register");
      register.put("function", function);
      register.put("address", address + i * (real ? 2 : 1));
      register.put("type", real ? "float32" : "int16");
      if (real) {
        register.put("words", order.word());
      } else {
        field.put("scale", 0.01);
      }
      measure(field, i == 0 ? Kind.PRESSURE : Kind.TEMPERATURE, i == 0 ? "bar" : "C");
    }
    return text(root);
  }

  private static ObjectNode root(String speaks, LineSettings line) {
    ObjectNode root = MAPPER.createObjectNode();
    root.put("$schema", "profile.schema.json");
    root.put("name", "my-gauge");
    root.put("title", "Guessed from what came in: check every unit, range and accuracy");
    root.put("speaks", speaks);
    ObjectNode settings = root.putObject("line");
    settings.put("baud", line.baud());
    settings.put("data-bits", line.dataBits());
    settings.put("parity", line.parity().name().toLowerCase(Locale.ROOT));
    settings.put("stop-bits", line.stopBits());
    return root;
  }

  private static void measure(ObjectNode field, Kind kind, String unit) {
    boolean pressure = kind == Kind.PRESSURE;
    field.put("measures", pressure ? "pressure" : "temperature");
    field.put("unit", unit);
    boolean absolute = pressure && unit.endsWith("a") && !unit.equals("Pa") && !unit.endsWith("Pa");
    ArrayNode range = field.putArray("range");
    if (pressure) {
      range.add(absolute ? "0 bara" : "-1 bar").add(absolute ? "11 bara" : "10 bar");
    } else {
      range.add("-20 C").add("120 C");
    }
    field.put("accuracy", pressure ? "25 mbar" : "0.5 C");
  }

  private static String text(ObjectNode root) {
    try {
      return MAPPER.writerWithDefaultPrettyPrinter().writeValueAsString(root);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException(e);
    }
  }
}

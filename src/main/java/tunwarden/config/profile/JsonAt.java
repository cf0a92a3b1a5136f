package tunwarden.config.profile;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import tunwarden.units.BadInputException;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;

/**
 * A JSON object that knows where it stands, so that every complaint names file and key.
 *
 * @param file name of the file, for people
 * @param path keys down to here, parted by dots; empty at the top
 * @param node the object
 */
record JsonAt(String file, String path, JsonNode node) {
  JsonAt {
    if (!node.isObject()) {
      throw new BadInputException(file + ": " + path + " must be an object in braces");
    }
  }

  BadInputException bad(String key, String problem) {
    String place = path.isEmpty() ? key : path + "." + key;
    return new BadInputException(file + ": " + place + " " + problem);
  }

  /** Refuses keys that nobody reads. */
  void allow(String... known) {
    TreeSet<String> allowed = new TreeSet<>(List.of(known));
    for (Iterator<String> names = node.fieldNames(); names.hasNext(); ) {
      String name = names.next();
      if (!allowed.contains(name)) {
        throw bad(name, "is not known here; known are " + String.join(", ", allowed));
      }
    }
  }

  boolean has(String key) {
    return node.has(key);
  }

  JsonAt object(String key) {
    if (!has(key)) {
      throw bad(key, "is missing");
    }
    return new JsonAt(file, path.isEmpty() ? key : path + "." + key, node.get(key));
  }

  List<String> names() {
    List<String> names = new ArrayList<>();
    node.fieldNames().forEachRemaining(names::add);
    return names;
  }

  String text(String key) {
    if (!has(key)) {
      throw bad(key, "is missing");
    }
    return text(key, "");
  }

  String text(String key, String otherwise) {
    JsonNode value = node.get(key);
    if (value == null) {
      return otherwise;
    }
    if (!value.isTextual()) {
      throw bad(key, "must be a text in quotes");
    }
    return value.textValue();
  }

  /** One character of code below 128. */
  char character(String key, char otherwise) {
    String text = text(key, String.valueOf(otherwise));
    if (text.length() != 1 || text.charAt(0) > 0x7F) {
      throw bad(key, "must be one ASCII character, such as \"\\n\" or \"=\"");
    }
    return text.charAt(0);
  }

  double number(String key, double otherwise) {
    JsonNode value = node.get(key);
    if (value == null) {
      return otherwise;
    }
    if (!value.isNumber() || !Double.isFinite(value.doubleValue())) {
      throw bad(key, "must be a number without quotes");
    }
    return value.doubleValue();
  }

  int whole(String key, int low, int high, int otherwise) {
    double value = number(key, otherwise);
    if (value != Math.rint(value) || value < low || value > high) {
      throw bad(key, "must be a whole number from " + low + " to " + high);
    }
    return (int) value;
  }

  /** The choice with that word, out of a table from word to choice. */
  <T> T choice(String key, Map<String, T> choices, String otherwise) {
    String word = otherwise == null ? text(key) : text(key, otherwise);
    T choice = choices.get(word);
    if (choice == null) {
      String known = String.join(", ", new TreeSet<>(choices.keySet()));
      throw bad(key, "is '" + word + "'; it must be one of " + known);
    }
    return choice;
  }

  /** Elements of an array as texts; numbers are taken as written. */
  List<JsonNode> list(String key) {
    JsonNode value = node.get(key);
    if (value == null) {
      return List.of();
    }
    if (!value.isArray()) {
      throw bad(key, "must be a list in brackets");
    }
    List<JsonNode> elements = new ArrayList<>();
    value.forEach(elements::add);
    return elements;
  }

  double durationS(String key, String otherwise) {
    return quantity(key, text(key, otherwise), Kind.DURATION);
  }

  /** A value in SI; a pressure must be counted from what the field is. */
  double quantity(String key, String text, Kind kind, Pressure.Reference reference) {
    if (kind != Kind.PRESSURE) {
      return quantity(key, text, kind);
    }
    try {
      Pressure pressure = Pressure.parse(text);
      if (pressure.reference() != reference) {
        String letter = reference == Pressure.Reference.ABSOLUTE ? "'bara'" : "'bar'";
        throw bad(key, "is " + text + "; write it as the unit of the field does, as in " + letter);
      }
      return pressure.pa();
    } catch (BadQuantityException e) {
      throw bad(key, "is wrong: " + e.getMessage());
    }
  }

  double quantity(String key, String text, Kind kind) {
    try {
      return Quantities.parse(text, kind);
    } catch (BadQuantityException e) {
      throw bad(key, "is wrong: " + e.getMessage());
    }
  }
}

package tunwarden.config;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import tunwarden.units.BadInputException;

/**
 * One table of the cellar file. Asking for a key makes it known; {@link #close} then refuses every
 * key that nobody asked for. A value that will not do is recorded as a problem and read as absent,
 * so that one pass tells everything that is wrong.
 */
final class Section {
  private final JsonNode node;
  private final List<String> path;
  private final Problems problems;
  private final Set<String> known = new LinkedHashSet<>();

  Section(JsonNode node, List<String> path, Problems problems) {
    this.node = node;
    this.path = path;
    this.problems = problems;
  }

  /** The names written in this table, in the order of the file. */
  List<String> names() {
    List<String> names = new ArrayList<>();
    node.fieldNames().forEachRemaining(names::add);
    return names;
  }

  boolean has(String key) {
    known.add(key);
    return node.has(key);
  }

  /** Whether the value is a bare text rather than a table. */
  boolean isText(String key) {
    return has(key) && node.get(key).isTextual();
  }

  /** The table under a key; one without any keys where there is none. */
  Section section(String key) {
    known.add(key);
    JsonNode child = node.path(key);
    if (!child.isMissingNode() && !child.isObject()) {
      problem(key, "write a table here, as [" + String.join(".", at(key)) + "] or { … }");
      child = MissingNode.getInstance();
    }
    return new Section(child, at(key), problems);
  }

  /** A text. */
  Optional<String> text(String key) {
    known.add(key);
    JsonNode value = node.get(key);
    if (value == null) {
      return Optional.empty();
    }
    if (!value.isTextual()) {
      problem(key, "write a text in quotes, not " + value);
      return Optional.empty();
    }
    return Optional.of(value.textValue());
  }

  /** A list of texts. */
  Optional<List<String>> texts(String key) {
    known.add(key);
    JsonNode value = node.get(key);
    if (value == null) {
      return Optional.empty();
    }
    List<String> texts = new ArrayList<>();
    value.forEach(item -> texts.add(item.isTextual() ? item.textValue() : null));
    if (!value.isArray() || texts.isEmpty() || texts.contains(null)) {
      problem(key, "write a list of texts in quotes, as [\"one\", \"two\"]");
      return Optional.empty();
    }
    return Optional.of(texts);
  }

  /** A whole number. */
  Optional<Integer> whole(String key, int least, int most) {
    known.add(key);
    JsonNode value = node.get(key);
    if (value == null) {
      return Optional.empty();
    }
    if (!value.isInt() || value.intValue() < least || value.intValue() > most) {
      problem(key, "write a whole number from " + least + " to " + most + ", not " + value);
      return Optional.empty();
    }
    return Optional.of(value.intValue());
  }

  /** True or false. */
  Optional<Boolean> flag(String key) {
    known.add(key);
    JsonNode value = node.get(key);
    if (value == null) {
      return Optional.empty();
    }
    if (!value.isBoolean()) {
      problem(key, "write true or false without quotes, not " + value);
      return Optional.empty();
    }
    return Optional.of(value.booleanValue());
  }

  /** A text turned into something by a parser that explains its refusals. */
  <T> Optional<T> parsed(String key, Function<String, T> parser) {
    JsonNode value = node.get(key);
    if (value != null && value.isNumber()) {
      known.add(key);
      problem(key, "write the number with its unit in quotes, not " + value.asText());
      return Optional.empty();
    }
    Optional<String> text = text(key);
    try {
      return text.map(parser);
    } catch (BadInputException refused) {
      problem(key, refused.getMessage());
      return Optional.empty();
    }
  }

  /** Tells of one item of a list that its parser refuses. */
  void check(String key, String item, Function<String, ?> parser) {
    try {
      parser.apply(item);
    } catch (BadInputException refused) {
      problem(key, refused.getMessage());
    }
  }

  /** A quantity in SI. */
  OptionalDouble quantity(String key, Function<String, Double> parser) {
    return parsed(key, parser).map(OptionalDouble::of).orElse(OptionalDouble.empty());
  }

  /** Tells of a required key that is absent. A key that is there but wrong was told of already. */
  void require(String key, String example) {
    if (!has(key)) {
      problems.add(path, "'" + key + "' is missing; write for example " + key + " = " + example);
    }
  }

  /** Records a problem with the value of a key. */
  void problem(String key, String sentence) {
    problems.add(at(key), sentence);
  }

  /** Refuses every key that was not asked for. */
  void close() {
    for (String name : names()) {
      if (!known.contains(name)) {
        String hint =
            Nearest.to(name, known)
                .map(near -> "did you mean '" + near + "'?")
                .orElse("known here: " + String.join(", ", known));
        problem(name, "there is no such key here; " + hint);
      }
    }
  }

  private List<String> at(String key) {
    List<String> longer = new ArrayList<>(path);
    longer.add(key);
    return longer;
  }
}

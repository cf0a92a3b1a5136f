package tunwarden.config.profile;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tunwarden.units.BadInputException;

/** The schema beside the profiles says the same as the reader. */
class ProfileSchemaTest {
  private static final Path DEVICES = Path.of("devices");
  private static final ObjectMapper MAPPER = new ObjectMapper();
  private static final JsonSchema SCHEMA = schema();

  private static JsonSchema schema() {
    return JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012)
        .getSchema(Profiles.shippedText("profile.schema"));
  }

  static List<String> shipped() {
    return Profiles.SHIPPED;
  }

  @Test
  void everyFileOfTheFolderIsShippedAndNothingElse() throws Exception {
    List<String> names = new ArrayList<>();
    try (Stream<Path> files = Files.list(DEVICES)) {
      files.map(f -> f.getFileName().toString().replace(".json", "")).forEach(names::add);
    }
    names.remove("profile.schema");
    assertEquals(Profiles.SHIPPED.stream().sorted().toList(), names.stream().sorted().toList());
  }

  @ParameterizedTest
  @MethodSource("shipped")
  void shippedProfilesFollowTheSchemaAndAreNamedAsTheirFile(String name) throws Exception {
    JsonNode json = MAPPER.readTree(Profiles.shippedText(name));
    assertTrue(SCHEMA.validate(json).isEmpty(), () -> SCHEMA.validate(json).toString());
    assertEquals(name, Profiles.find(name, Path.of("")).name());
  }

  private static void bothRefuse(JsonNode json) {
    assertFalse(SCHEMA.validate(json).isEmpty(), () -> "the schema takes " + json);
    assertThrows(
        BadInputException.class,
        () -> ProfileReader.read(json.toString(), "f"),
        () -> "the reader takes " + json);
  }

  /** Every key of every object is misspelt once, and every value replaced by a wrong type. */
  @ParameterizedTest
  @MethodSource("shipped")
  void aWrongKeyOrTypeAnywhereIsRefusedByBoth(String name) throws Exception {
    JsonNode whole = MAPPER.readTree(Profiles.shippedText(name));
    for (String pointer : objects(whole, "")) {
      ObjectNode object = (ObjectNode) whole.at(pointer);
      for (String key : names(object)) {
        if (pointer.equals("/fields") || key.equals("$schema")) {
          continue;
        }
        JsonNode value = object.get(key);
        object.remove(key);
        object.set(key + "x", value);
        bothRefuse(whole);
        object.remove(key + "x");
        object.put(key, value.isTextual() ? null : "wrong");
        bothRefuse(whole);
        object.set(key, value);
      }
    }
    assertTrue(SCHEMA.validate(whole).isEmpty());
  }

  private static List<String> names(ObjectNode object) {
    List<String> names = new ArrayList<>();
    object.fieldNames().forEachRemaining(names::add);
    return names;
  }

  private static List<String> objects(JsonNode node, String pointer) {
    List<String> found = new ArrayList<>();
    if (node.isObject()) {
      found.add(pointer);
      for (String key : names((ObjectNode) node)) {
        found.addAll(objects(node.get(key), pointer + "/" + key));
      }
    }
    return found;
  }

  @Test
  void aMessageNamesFileKeyAndRemedy() {
    String text = Profiles.shippedText("modbus-rtu-float");
    BadInputException refused =
        assertThrows(
            BadInputException.class,
            () -> ProfileReader.read(text.replace("\"float32\"", "\"float\""), "own.json"));
    assertEquals(
        "own.json: fields.pressure.register.type is 'float'; it must be one of bit, float32,"
            + " float64, int16, int32, uint16, uint32",
        refused.getMessage());
  }
}

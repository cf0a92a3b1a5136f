package tunwarden.config.profile;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.time.Duration;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import tunwarden.units.BadInputException;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.Polling;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;

/** Reads a device profile; the rules are those of {@code devices/profile.schema.json}. */
public final class ProfileReader {
  private static final int LONGEST_LIST = 256;
  private static final ObjectMapper MAPPER =
      JsonMapper.builder()
          .enable(JsonParser.Feature.STRICT_DUPLICATE_DETECTION)
          .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
          .build();

  private ProfileReader() {}

  /**
   * Reads the text of a profile.
   *
   * @param json the text
   * @param file name for complaints
   * @throws BadInputException with one sentence that names the file and the key
   */
  public static Profile read(String json, String file) {
    JsonNode root;
    try {
      root = MAPPER.readTree(json);
    } catch (JsonProcessingException e) {
      int line = e.getLocation() == null ? 1 : e.getLocation().getLineNr();
      throw new BadInputException(
          file + " line " + line + ": not JSON: " + e.getOriginalMessage(), e);
    }
    return profile(new JsonAt(file, "", root));
  }

  private static Profile profile(JsonAt at) {
    at.allow(
        "$schema",
        "name",
        "title",
        "speaks",
        "line",
        "framing",
        "period",
        "timeout",
        "retries",
        "turnaround",
        "fields");
    Speaks speaks = at.choice("speaks", table(Speaks.values(), Speaks::word), null);
    LineSettings line = at.has("line") ? line(at.object("line")) : LineSettings.USUAL;
    Framing framing = at.has("framing") ? framing(at.object("framing")) : Framing.PAIRS;
    if (at.has("framing") && speaks == Speaks.MODBUS_RTU) {
      throw at.bad("framing", "has no meaning for modbus-rtu; remove it");
    }
    return new Profile(
        at.text("name"),
        at.text("title"),
        speaks,
        line,
        framing,
        polling(at),
        fields(at.object("fields"), speaks, framing));
  }

  private static Map<String, Field> fields(JsonAt at, Speaks speaks, Framing framing) {
    Map<String, Field> fields = new LinkedHashMap<>();
    for (String name : at.names()) {
      fields.put(name, new FieldReader(at.object(name), speaks, framing).read(name));
    }
    if (fields.isEmpty() || fields.size() > LONGEST_LIST) {
      throw new BadInputException(at.file() + ": fields must hold 1 to " + LONGEST_LIST);
    }
    return Collections.unmodifiableMap(fields);
  }

  private static Polling polling(JsonAt at) {
    Duration period = duration(at, "period", "1 s", 0.05);
    Duration timeout = duration(at, "timeout", "150 ms", 0.01);
    Duration turnaround = duration(at, "turnaround", "0 ms", 0);
    if (turnaround.toMillis() > 500) {
      throw at.bad("turnaround", "must be at most 500 ms");
    }
    if (timeout.toSeconds() > 10) {
      throw at.bad("timeout", "must be at most 10 s");
    }
    return new Polling(period, timeout, at.whole("retries", 0, 2, 1), turnaround);
  }

  private static Duration duration(JsonAt at, String key, String otherwise, double leastS) {
    double seconds = at.durationS(key, otherwise);
    if (!(seconds >= leastS && seconds <= 86_400)) {
      throw at.bad(key, "must be from " + leastS + " s to 1 d");
    }
    return Duration.ofNanos(Math.round(seconds * 1e9));
  }

  private static LineSettings line(JsonAt at) {
    at.allow("baud", "data-bits", "parity", "stop-bits", "flow", "dtr", "rs485", "settle");
    Map<String, LineSettings.Flow> flows =
        Map.of(
            "none", LineSettings.Flow.NONE,
            "rts-cts", LineSettings.Flow.RTS_CTS,
            "xon-xoff", LineSettings.Flow.XON_XOFF);
    return new LineSettings(
        at.whole("baud", 50, 4_000_000, LineSettings.USUAL.baud()),
        at.whole("data-bits", 7, 8, 8),
        at.choice("parity", table(LineSettings.Parity.values(), ProfileReader::lower), "none"),
        at.whole("stop-bits", 1, 2, 1),
        at.choice("flow", flows, "none"),
        new LineSettings.Wires(
            at.choice("dtr", Map.of("on", true, "off", false), "on"),
            at.choice("rs485", table(LineSettings.Rs485.values(), ProfileReader::lower), "leave")),
        duration(at, "settle", "0 s", 0));
  }

  private static Framing framing(JsonAt at) {
    at.allow("end", "start", "layout", "between", "joined-by", "decimal", "check");
    Framing usual = Framing.PAIRS;
    String between = at.text("between", usual.between());
    if (between.isEmpty() || between.chars().anyMatch(c -> c > 0x7F)) {
      throw at.bad("between", "must hold at least one ASCII character that parts the values");
    }
    return new Framing(
        at.character("end", usual.end()),
        at.text("start", ""),
        at.choice("layout", table(Framing.Layout.values(), ProfileReader::lower), "pairs"),
        between,
        at.character("joined-by", usual.joinedBy()),
        at.choice("decimal", Map.of("point", false, "comma", true), "point"),
        at.choice("check", table(Framing.Check.values(), Framing.Check::word), "none"));
  }

  private static String lower(Enum<?> choice) {
    return choice.name().toLowerCase(Locale.ROOT);
  }

  static <T> Map<String, T> table(T[] values, Function<? super T, String> word) {
    return Arrays.stream(values).collect(Collectors.toMap(word, v -> v));
  }
}

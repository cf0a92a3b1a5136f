package tunwarden.journal.request;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.DateTimeException;
import java.time.Duration;
import java.time.Instant;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import tunwarden.alarm.AlarmKind;

/**
 * One thing that a person wants done.
 *
 * @param deed what
 * @param vessel of which vessel; empty for the station itself
 * @param alarm which alarm; empty for all that want it, or for a note
 * @param word what the person says about it; may be empty
 * @param length how long to shelve for
 * @param asked when it was asked
 */
public record Request(
    Deed deed,
    String vessel,
    Optional<AlarmKind> alarm,
    String word,
    Optional<Duration> length,
    Instant asked) {
  private static final int LONGEST_WORD = 500;
  private static final ObjectMapper JSON =
      JsonMapper.builder(
              JsonFactory.builder()
                  .streamReadConstraints(
                      StreamReadConstraints.builder()
                          .maxNestingDepth(2)
                          .maxStringLength(4000)
                          .build())
                  .build())
          .build();

  /** What can be asked for. */
  public enum Deed {
    ACKNOWLEDGE,
    SHELVE,
    UNSHELVE,
    OUT_OF_SERVICE,
    IN_SERVICE,
    NOTE;

    /** Name in files and commands: {@code out-of-service}. */
    public String id() {
      return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
  }

  /** Cuts an over-long word and takes control characters out of it. */
  public Request {
    String clean = word.replaceAll("\\p{Cntrl}", " ").strip();
    word = clean.length() <= LONGEST_WORD ? clean : clean.substring(0, LONGEST_WORD) + " ...";
  }

  byte[] bytes() {
    ObjectNode node = JSON.createObjectNode();
    node.put("deed", deed.id()).put("vessel", vessel).put("word", word);
    alarm.ifPresent(kind -> node.put("alarm", kind.id()));
    length.ifPresent(span -> node.put("seconds", span.toSeconds()));
    node.put("asked", asked.toString());
    return node.toString().getBytes(StandardCharsets.UTF_8);
  }

  /**
   * Reads a request.
   *
   * @throws IllegalArgumentException with one plain sentence when it is none
   */
  static Request read(byte[] bytes) {
    try {
      JsonNode node = JSON.readTree(bytes);
      String deed = node.path("deed").asText();
      return new Request(
          Arrays.stream(Deed.values())
              .filter(known -> known.id().equals(deed))
              .findFirst()
              .orElseThrow(() -> new IllegalArgumentException("nobody here can " + quoted(deed))),
          node.path("vessel").asText(""),
          alarm(node.path("alarm").asText("")),
          node.path("word").asText(""),
          node.path("seconds").canConvertToLong()
              ? Optional.of(Duration.ofSeconds(node.path("seconds").asLong()))
              : Optional.empty(),
          Instant.parse(node.path("asked").asText()));
    } catch (IOException | DateTimeException notOurs) {
      throw new IllegalArgumentException("this is no request", notOurs);
    }
  }

  private static Optional<AlarmKind> alarm(String id) {
    if (id.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        AlarmKind.ofId(id)
            .orElseThrow(
                () -> new IllegalArgumentException("there is no alarm called " + quoted(id))));
  }

  private static String quoted(String text) {
    String clean = text.replaceAll("\\p{Cntrl}", "?");
    return "'" + (clean.length() <= 40 ? clean : clean.substring(0, 40) + "...") + "'";
  }
}

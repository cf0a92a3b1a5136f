package tunwarden.config;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A commented cellar file from answers. Each line of the template holds places such as {@code
 * ${fill|1800 L}}: an answered line is filled in, an unanswered one stays as a comment that shows
 * the example.
 */
public final class CellarTemplate {
  private static final String RESOURCE = "/tunwarden/config/cellar-template.toml";
  private static final String VESSEL_BEGINS = "#: vessel\n";
  private static final String VESSEL_ENDS = "#: end\n";
  private static final Pattern PLACE = Pattern.compile("\\$\\{([a-z-]+)\\|([^}]*)}");

  private CellarTemplate() {}

  /** The example: every line filled in with what it shows. */
  public static String example() {
    String text = text().replace(VESSEL_BEGINS, "").replace(VESSEL_ENDS, "");
    return PLACE.matcher(text).replaceAll(place -> Matcher.quoteReplacement(place.group(2)));
  }

  /**
   * A file from answers.
   *
   * @param common answers outside the vessels, by the name of their place
   * @param vessels answers for each vessel
   */
  public static String fill(Map<String, String> common, List<Map<String, String>> vessels) {
    String text = text();
    int begin = text.indexOf(VESSEL_BEGINS);
    int end = text.indexOf(VESSEL_ENDS);
    String block = text.substring(begin + VESSEL_BEGINS.length(), end);
    StringBuilder file = new StringBuilder(lines(text.substring(0, begin), common));
    vessels.forEach(answers -> file.append(lines(block, answers)));
    return file.append(lines(text.substring(end + VESSEL_ENDS.length()), common)).toString();
  }

  private static String lines(String block, Map<String, String> answers) {
    StringBuilder filled = new StringBuilder();
    for (String line : block.split("\n", -1)) {
      Matcher place = PLACE.matcher(line);
      boolean answered = true;
      StringBuilder text = new StringBuilder();
      while (place.find()) {
        String answer = answers.get(place.group(1));
        answered &= answer != null || !isFirst(line, place);
        String value = answer == null ? place.group(2) : escaped(answer);
        place.appendReplacement(text, Matcher.quoteReplacement(value));
      }
      place.appendTail(text);
      filled.append(answered ? "" : "# ").append(text).append('\n');
    }
    return filled.substring(0, filled.length() - 1);
  }

  /**
   * Whether the line is about this place: a line is left out when its first place has no answer.
   */
  private static boolean isFirst(String line, Matcher place) {
    return line.indexOf("${") == place.start();
  }

  /** A text as it stands between quotes in TOML. */
  private static String escaped(String text) {
    StringBuilder escaped = new StringBuilder();
    for (char c : text.toCharArray()) {
      if (c == '"' || c == '\\') {
        escaped.append('\\').append(c);
      } else if (c >= ' ' && c != 0x7F) {
        escaped.append(c);
      }
    }
    return escaped.toString();
  }

  private static String text() {
    try (InputStream in = CellarTemplate.class.getResourceAsStream(RESOURCE)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).replace("\r\n", "\n");
    } catch (IOException fault) {
      throw new UncheckedIOException(fault);
    }
  }
}

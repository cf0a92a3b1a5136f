package tunwarden.replay.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.units.Kind;

/**
 * A column header taken apart into a name and a unit: {@code P [psi]}, {@code Temp (°F)}, {@code
 * Druck/mbar}, {@code pressure_kpa}, {@code T, °C}.
 *
 * @param name what stands before the unit
 * @param unitText the unit as written; empty for none
 * @param words the name in small letters, cut at everything that is no letter or digit
 */
record HeaderText(String name, String unitText, List<String> words) {
  /** Name, unit in brackets, then perhaps a word that says gauge or absolute. */
  private static final Pattern BRACKETS =
      Pattern.compile("^(.*?)\\s*[\\[(<{]\\s*([^\\])>}]+?)\\s*[\\])>}]\\s*[\\[(]?(\\w*)[\\])]?$");

  /** Name, unit, and a separate word that says gauge or absolute. */
  private static final Pattern WORD_BEHIND =
      Pattern.compile("^(.*?)[\\s_/]+(\\S+?)[\\s_](g|a|abs|gauge)$");

  /** Name and unit at the end, after a slash, comma, blank, underscore or "in". */
  private static final Pattern TAIL =
      Pattern.compile("^(.*\\S)\\s*(?:/|,|\\bin\\b|\\s|_|-)\\s*(\\S+)$");

  private static final int SHORTEST_BARE_UNIT = 2;
  private static final List<Kind> KINDS =
      List.of(Kind.PRESSURE, Kind.TEMPERATURE, Kind.VOLUME, Kind.EXTRACT, Kind.GAS_CONTENT);

  HeaderText(String header) {
    this(split(header));
  }

  private HeaderText(String[] parts) {
    this(parts[0], parts[1], wordsOf(parts[0]));
  }

  private static String[] split(String header) {
    Matcher brackets = BRACKETS.matcher(header.trim());
    if (brackets.matches()) {
      String whole = brackets.group(2) + brackets.group(3);
      return new String[] {brackets.group(1), anyUnit(whole) ? whole : brackets.group(2)};
    }
    String rest = header.trim();
    if (rest.length() > SHORTEST_BARE_UNIT && anyUnit(rest)) {
      return new String[] {"", rest};
    }
    Matcher behind = WORD_BEHIND.matcher(rest);
    if (behind.matches() && anyUnit(behind.group(2) + behind.group(3))) {
      return new String[] {behind.group(1), behind.group(2) + behind.group(3)};
    }
    Matcher tail = TAIL.matcher(rest);
    if (tail.matches() && anyUnit(tail.group(2))) {
      return new String[] {tail.group(1), tail.group(2)};
    }
    return new String[] {rest, ""};
  }

  /** A field without the brackets a line of units may put around each. */
  static String bare(String field) {
    return field.replaceAll("^[\\[(<{]|[\\])>}]$", "").trim();
  }

  static boolean anyUnit(String text) {
    return !text.isEmpty() && KINDS.stream().anyMatch(k -> CellUnit.parse(text, k).isPresent());
  }

  static List<String> wordsOf(String name) {
    String spaced = name.replaceAll("(\\p{Ll})(\\p{Lu})", "$1 $2").toLowerCase(Locale.ROOT);
    List<String> words = new ArrayList<>();
    for (String word : spaced.split("[^\\p{L}\\p{N}]+")) {
      if (!word.isEmpty()) {
        words.add(word);
      }
    }
    return words;
  }

  /** The stated unit as one of that kind. */
  Optional<CellUnit> unit(Kind kind) {
    return unitText.isEmpty() ? Optional.empty() : CellUnit.parse(unitText, kind);
  }
}

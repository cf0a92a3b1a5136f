package tunwarden.wire.guess;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.units.Kind;
import tunwarden.wire.profile.Framing;
import tunwarden.wire.profile.Framing.Check;
import tunwarden.wire.profile.Framing.Layout;
import tunwarden.wire.text.Checks;
import tunwarden.wire.text.LineFramer;

/**
 * A guess at lines of text: how they are framed and which numbers stand in them.
 *
 * @param framing how the lines seem to be framed
 * @param cells the numbers found that seem to be pressures or temperatures
 * @param certain whether names or units told what they are; otherwise the first number was taken
 *     for a pressure and the second for a temperature
 */
public record TextGuess(Framing framing, List<Cell> cells, boolean certain) {
  private static final String NUMBER = "[+-]?\\d+(?:[.,]\\d+)?(?:[eE][+-]?\\d+)?";
  private static final Pattern PAIR =
      Pattern.compile(
          "([A-Za-z][\\w.-]{0,20})([=:])(\\s?)("
              + NUMBER
              + "[^\\s,;|=:\\d]{0,8}(?:\\s[^\\d\\s=:;,|]{1,6}(?![\\w=:]))?)");
  private static final Pattern START = Pattern.compile("^[$!][A-Za-z0-9]{1,10},");
  private static final String SEPARATORS = ";,|\t ";
  private static final int FEWEST = 2;

  /** The guess at what was heard; empty when it holds no two like lines of text with numbers. */
  public static Optional<TextGuess> at(byte[] heard) {
    String text = new String(heard, StandardCharsets.ISO_8859_1);
    char end = text.indexOf('\n') >= 0 ? '\n' : '\r';
    List<String> lines = new LineFramer(end, false).accept(heard, heard.length);
    if (lines.size() < FEWEST) {
      return Optional.empty();
    }
    Check check = check(lines);
    String start = start(lines);
    List<String> bodies = new ArrayList<>();
    for (String line : lines) {
      Checks.proved(line, check)
          .filter(body -> body.startsWith(start))
          .ifPresent(body -> bodies.add(body.substring(start.length())));
    }
    Optional<TextGuess> pairs = pairs(end, start, check, bodies);
    return pairs.isPresent() ? pairs : columns(end, start, check, bodies);
  }

  /** The proof that most lines pass; a line damaged on the way does not speak against it. */
  private static Check check(List<String> lines) {
    for (Check check : Check.values()) {
      long proved = lines.stream().filter(l -> Checks.proved(l, check).isPresent()).count();
      if (check != Check.NONE && proved > lines.size() / 2) {
        return check;
      }
    }
    return Check.NONE;
  }

  private static String start(List<String> lines) {
    Matcher matcher = START.matcher(lines.get(lines.size() - 1));
    return matcher.find() ? matcher.group() : "";
  }

  private static Optional<TextGuess> pairs(
      char end, String start, Check check, List<String> bodies) {
    Map<String, Cell> cells = new LinkedHashMap<>();
    char join = '=';
    boolean spaced = false;
    StringBuilder between = new StringBuilder();
    for (String body : bodies) {
      Matcher matcher = PAIR.matcher(body);
      int last = 0;
      while (matcher.find()) {
        join = matcher.group(2).charAt(0);
        spaced |= !matcher.group(3).isEmpty();
        addBetween(between, body.substring(last, matcher.start()));
        last = matcher.end();
        String key = matcher.group(1);
        Cell.of(key, matcher.group(4)).ifPresent(cell -> cells.putIfAbsent(key, cell));
      }
      addBetween(between, last > 0 ? body.substring(last) : "");
    }
    if (cells.isEmpty()) {
      return Optional.empty();
    }
    String parts = between.toString();
    if (spaced) {
      // a blank within a pair cannot also part the pairs
      parts = parts.replace(" ", "");
    }
    parts = parts.isEmpty() ? spaced ? ";" : " " : parts;
    boolean comma = hasComma(cells) && parts.indexOf(',') < 0;
    Framing framing = new Framing(end, start, Layout.PAIRS, parts, join, comma, check);
    return Optional.of(named(framing, new ArrayList<>(cells.values())));
  }

  private static void addBetween(StringBuilder between, String gap) {
    for (char c : gap.toCharArray()) {
      if (SEPARATORS.indexOf(c) >= 0 && between.indexOf(String.valueOf(c)) < 0) {
        between.append(c);
      }
    }
  }

  private static boolean hasComma(Map<String, Cell> cells) {
    return cells.values().stream().anyMatch(cell -> cell.example().indexOf(',') >= 0);
  }

  /** The separator that cuts every line into the same number of cells with most numbers in them. */
  private static Optional<TextGuess> columns(
      char end, String start, Check check, List<String> bodies) {
    Map<String, Cell> best = Map.of();
    char separator = ' ';
    for (char candidate : SEPARATORS.toCharArray()) {
      Map<String, Cell> cells = cells(bodies, candidate);
      if (cells.size() > best.size()) {
        best = cells;
        separator = candidate;
      }
    }
    if (best.isEmpty()) {
      return Optional.empty();
    }
    boolean comma = separator != ',' && hasComma(best);
    Framing framing =
        new Framing(end, start, Layout.COLUMNS, String.valueOf(separator), '=', comma, check);
    return Optional.of(named(framing, new ArrayList<>(best.values())));
  }

  private static Map<String, Cell> cells(List<String> bodies, char separator) {
    Map<String, Cell> cells = new LinkedHashMap<>();
    String pattern = separator == ' ' ? " +" : Pattern.quote(String.valueOf(separator));
    int width = -1;
    for (String body : bodies) {
      String[] parts = body.strip().split(pattern, -1);
      if (width >= 0 && parts.length != width) {
        return Map.of();
      }
      width = parts.length;
      for (int i = 0; i < parts.length; i++) {
        String name = String.valueOf(i + 1);
        Optional<Cell> cell = Cell.of(name, parts[i]);
        cell.ifPresent(found -> cells.putIfAbsent(name, found));
      }
    }
    return cells;
  }

  private static TextGuess named(Framing framing, List<Cell> found) {
    List<Cell> known = found.stream().filter(cell -> cell.kind().isPresent()).toList();
    if (!known.isEmpty()) {
      return new TextGuess(framing, known, true);
    }
    List<Cell> taken = new ArrayList<>();
    taken.add(found.get(0).as(Kind.PRESSURE));
    if (found.size() > 1) {
      taken.add(found.get(1).as(Kind.TEMPERATURE));
    }
    return new TextGuess(framing, taken, false);
  }
}

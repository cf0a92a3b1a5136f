package tunwarden.config;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * On which line of a TOML text each key stands. The values are read by a TOML parser, which does
 * not tell lines for keys; this scan looks at keys and brackets only and never at the meaning of a
 * value. It also remembers the first key that is written twice. Any text may be given: what is not
 * TOML gives an index of little use, never a failure.
 */
final class LineIndex {
  /** Deeper than any file that is accepted; beyond it the scan gives up. */
  private static final int MOST_DEPTH = 64;

  private final String text;
  private final Map<List<String>, Integer> lines = new HashMap<>();
  private final Deque<List<String>> inline = new ArrayDeque<>();
  private List<String> table = List.of();
  private List<String> duplicate;
  private int duplicateLine;
  private int at;
  private int line = 1;

  private LineIndex(String text) {
    this.text = text;
  }

  static LineIndex of(String text) {
    LineIndex index = new LineIndex(text);
    index.scan();
    return index;
  }

  /** The line of this key, or of the nearest table around it; 1 at the least. */
  int lineOf(List<String> path) {
    for (int length = path.size(); length > 0; length--) {
      Integer found = lines.get(path.subList(0, length));
      if (found != null) {
        return found;
      }
    }
    return 1;
  }

  /** The first key that is written twice, if any. */
  Optional<List<String>> duplicate() {
    return Optional.ofNullable(duplicate);
  }

  /** The line of its second writing. */
  int duplicateLine() {
    return duplicateLine;
  }

  private void scan() {
    while (skipToKey() && inline.size() < MOST_DEPTH) {
      if (text.charAt(at) == '[') {
        header();
      } else {
        assignment();
      }
    }
  }

  private void header() {
    while (at < text.length() && text.charAt(at) == '[') {
      at++;
    }
    table = key(List.of());
    note(table, lines.containsKey(table));
    skipComment();
  }

  private void assignment() {
    int start = at;
    List<String> base = inline.isEmpty() ? table : inline.peek();
    List<String> path = key(base);
    skipBlanks();
    if (at >= text.length() || text.charAt(at) != '=') {
      at = Math.max(at, start + 1);
      return;
    }
    at++;
    note(path, lines.containsKey(path));
    value(path);
  }

  private void note(List<String> path, boolean again) {
    if (again && duplicate == null) {
      duplicate = path;
      duplicateLine = line;
    }
    lines.putIfAbsent(path, line);
  }

  /** Passes over a value; an inline table leaves the scan inside it, at its first key. */
  private void value(List<String> path) {
    int depth = 0;
    while (at < text.length()) {
      char c = text.charAt(at);
      if (c == '"' || c == '\'') {
        string();
      } else if (c == '#') {
        skipComment();
      } else if (c == '{' && depth == 0) {
        at++;
        inline.push(path);
        return;
      } else if (depth == 0 && (c == '\n' || c == ',' || c == '}')) {
        return;
      } else {
        depth += c == '[' ? 1 : c == ']' ? -1 : 0;
        next();
      }
    }
  }

  /** Moves to the next key or header; closes inline tables on the way. */
  private boolean skipToKey() {
    while (at < text.length()) {
      char c = text.charAt(at);
      if (c == '}') {
        inline.poll();
        at++;
      } else if (c == '#') {
        skipComment();
      } else if (Character.isWhitespace(c) || c == ',') {
        next();
      } else {
        return true;
      }
    }
    return false;
  }

  private List<String> key(List<String> base) {
    List<String> path = new ArrayList<>(base);
    while (at < text.length()) {
      skipBlanks();
      int start = at;
      if (at < text.length() && (text.charAt(at) == '"' || text.charAt(at) == '\'')) {
        string();
        path.add(text.substring(start + 1, Math.max(start + 1, at - 1)));
      } else {
        while (at < text.length() && isBare(text.charAt(at))) {
          at++;
        }
        path.add(text.substring(start, at));
      }
      skipBlanks();
      if (at >= text.length() || text.charAt(at) != '.' || path.size() > MOST_DEPTH) {
        break;
      }
      at++;
    }
    return List.copyOf(path);
  }

  private void string() {
    char quote = text.charAt(at);
    String triple = String.valueOf(quote).repeat(3);
    boolean many = text.startsWith(triple, at);
    at += many ? 3 : 1;
    while (at < text.length()) {
      char c = text.charAt(at);
      if (c == '\\' && quote == '"') {
        next();
      } else if (many ? text.startsWith(triple, at) : c == quote || c == '\n') {
        at += many ? 3 : c == quote ? 1 : 0;
        return;
      }
      next();
    }
  }

  private void skipBlanks() {
    while (at < text.length() && (text.charAt(at) == ' ' || text.charAt(at) == '\t')) {
      at++;
    }
  }

  private void skipComment() {
    while (at < text.length() && text.charAt(at) != '\n') {
      at++;
    }
  }

  private void next() {
    if (at < text.length() && text.charAt(at) == '\n') {
      line++;
    }
    at++;
  }

  private static boolean isBare(char c) {
    return Character.isLetterOrDigit(c) || c == '-' || c == '_';
  }
}

package tunwarden.config;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the word a person may have meant. */
final class Nearest {
  private Nearest() {}

  /** The known word closest in spelling, if any is close enough to be a slip. */
  static Optional<String> to(String written, Collection<String> known) {
    return known.stream()
        .filter(word -> distance(written, word) <= Math.max(2, word.length() / 3))
        .min(Comparator.comparingInt(word -> distance(written, word)));
  }

  /** Single-letter changes that turn one word into the other (Levenshtein 1966). */
  static int distance(String a, String b) {
    int[] previous = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      previous[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] row = new int[b.length() + 1];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        row[j] = Math.min(previous[j - 1] + change, Math.min(previous[j], row[j - 1]) + 1);
      }
      previous = row;
    }
    return previous[b.length()];
  }
}

package tunwarden.wire.profile;

import java.util.Arrays;
import java.util.Optional;

/**
 * Order of the bytes of a value longer than one register; the letters name the bytes from the most
 * significant (A) down, in the order in which they arrive.
 */
public enum WordOrder {
  /** High word first, high byte first: A B C D. */
  HIGH_FIRST("high-first", false, false),
  /** Low word first, high byte first: C D A B. */
  LOW_FIRST("low-first", true, false),
  /** High word first, bytes swapped: B A D C. */
  HIGH_FIRST_SWAPPED("high-first-swapped", false, true),
  /** Low word first, bytes swapped: D C B A. */
  LOW_FIRST_SWAPPED("low-first-swapped", true, true);

  private final String word;
  private final boolean lowWordFirst;
  private final boolean bytesSwapped;

  WordOrder(String word, boolean lowWordFirst, boolean bytesSwapped) {
    this.word = word;
    this.lowWordFirst = lowWordFirst;
    this.bytesSwapped = bytesSwapped;
  }

  /** Name in a device profile. */
  public String word() {
    return word;
  }

  public boolean lowWordFirst() {
    return lowWordFirst;
  }

  public boolean bytesSwapped() {
    return bytesSwapped;
  }

  /** The order with that word, if there is one. */
  public static Optional<WordOrder> ofWord(String word) {
    return Arrays.stream(values()).filter(o -> o.word.equals(word)).findFirst();
  }
}

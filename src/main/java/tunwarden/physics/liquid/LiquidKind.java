package tunwarden.physics.liquid;

import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Collectors;

/** The drinks whose gas solubility is modelled. */
public enum LiquidKind {
  WATER("water"),
  BEER("beer"),
  WINE("wine"),
  SPARKLING_WINE("sparkling-wine"),
  CIDER("cider"),
  SOFT_DRINK("soft-drink"),
  MINERAL_WATER("mineral-water"),
  KOMBUCHA("kombucha");

  private final String word;

  LiquidKind(String word) {
    this.word = word;
  }

  /** Name on the command line and in cellar files. */
  public String word() {
    return word;
  }

  /** The kind with that word, if there is one. */
  public static Optional<LiquidKind> ofWord(String word) {
    return Arrays.stream(values()).filter(kind -> kind.word.equals(word)).findFirst();
  }

  /** All words, for help and error sentences. */
  public static String words() {
    return Arrays.stream(values()).map(LiquidKind::word).collect(Collectors.joining(", "));
  }
}

package tunwarden.physics.liquid;

import java.util.Arrays;
import java.util.Optional;

/** The two trade relations for CO2 in beer; they differ by 1 to 2 %. */
public enum BeerMethod {
  EUROPEAN("european"),
  CHART("chart");

  private final String word;

  BeerMethod(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }

  /** The method with that word, if there is one. */
  public static Optional<BeerMethod> ofWord(String word) {
    return Arrays.stream(values()).filter(method -> method.word.equals(word)).findFirst();
  }
}

package tunwarden.vessel;

import java.util.Arrays;
import java.util.Optional;

/** How the headspace is connected to the world, as far as the user has said. */
public enum Closure {
  /** All valves shut. */
  SEALED("sealed"),
  /** On a regulated gas supply. */
  SUPPLY("supply"),
  /** Behind a back-pressure (spunding) device that lets surplus gas out at a level. */
  SPUNDING("spunding"),
  /** Vent open to the room. */
  OPEN("open"),
  /** Not said: told from the readings. */
  INFER("infer");

  private final String word;

  Closure(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }

  /** The closure with that word, if there is one. */
  public static Optional<Closure> ofWord(String word) {
    return Arrays.stream(values()).filter(closure -> closure.word.equals(word)).findFirst();
  }
}

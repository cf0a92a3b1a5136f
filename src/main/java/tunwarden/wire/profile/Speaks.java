package tunwarden.wire.profile;

import java.util.Arrays;
import java.util.Optional;

/** How an instrument talks. */
public enum Speaks {
  /** It sends lines of text unasked. */
  TEXT_LINES("text-lines"),
  /** It answers each text with one line of text. */
  TEXT_QUERY("text-query"),
  /** It answers Modbus requests in the RTU framing. */
  MODBUS_RTU("modbus-rtu");

  private final String word;

  Speaks(String word) {
    this.word = word;
  }

  /** Name in a device profile. */
  public String word() {
    return word;
  }

  /** The way of talking with that word, if there is one. */
  public static Optional<Speaks> ofWord(String word) {
    return Arrays.stream(values()).filter(s -> s.word.equals(word)).findFirst();
  }
}

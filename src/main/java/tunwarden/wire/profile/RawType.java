package tunwarden.wire.profile;

import java.util.Arrays;
import java.util.Optional;

/** How the bits of Modbus registers are read. */
public enum RawType {
  BIT("bit", 1),
  UINT16("uint16", 1),
  INT16("int16", 1),
  UINT32("uint32", 2),
  INT32("int32", 2),
  FLOAT32("float32", 2),
  FLOAT64("float64", 4);

  private final String word;
  private final int registers;

  RawType(String word, int registers) {
    this.word = word;
    this.registers = registers;
  }

  /** Name in a device profile. */
  public String word() {
    return word;
  }

  /** How many registers it takes (one bit for {@link #BIT}). */
  public int registers() {
    return registers;
  }

  /** The type with that word, if there is one. */
  public static Optional<RawType> ofWord(String word) {
    return Arrays.stream(values()).filter(t -> t.word.equals(word)).findFirst();
  }
}

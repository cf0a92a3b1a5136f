package tunwarden.wire.guess;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.wire.modbus.Registers;
import tunwarden.wire.profile.RawType;
import tunwarden.wire.profile.WordOrder;

/** Every way in which a block of registers can be read, and which of them makes sense. */
public final class RegisterGuess {
  private static final double LEAST = 1e-3;
  private static final double MOST = 1e5;

  private RegisterGuess() {}

  /** One line for each register: as whole numbers, and with the next as longer ones. */
  public static List<String> table(byte[] data, int firstAddress) {
    List<String> lines = new ArrayList<>();
    for (int i = 0; 2 * i + 1 < data.length; i++) {
      WordOrder plain = WordOrder.HIGH_FIRST;
      lines.add(
          String.format(
              Locale.ROOT,
              "register %5d  %02x %02x  uint16 %5.0f  int16 %6.0f",
              firstAddress + i,
              data[2 * i],
              data[2 * i + 1],
              Registers.read(data, 2 * i, RawType.UINT16, plain),
              Registers.read(data, 2 * i, RawType.INT16, plain)));
      for (WordOrder order : 2 * i + 3 < data.length ? WordOrder.values() : new WordOrder[0]) {
        lines.add(
            String.format(
                Locale.ROOT,
                "    with the next, %-18s  float32 %-14.7g  int32 %11.0f  uint32 %10.0f",
                order.word(),
                Registers.read(data, 2 * i, RawType.FLOAT32, order),
                Registers.read(data, 2 * i, RawType.INT32, order),
                Registers.read(data, 2 * i, RawType.UINT32, order)));
      }
    }
    return lines;
  }

  /**
   * The word order in which most pairs of registers are floating-point numbers of everyday size.
   */
  public static WordOrder order(byte[] data) {
    WordOrder best = WordOrder.HIGH_FIRST;
    for (WordOrder order : WordOrder.values()) {
      best = sensible(data, order) > sensible(data, best) ? order : best;
    }
    return best;
  }

  /** Whether the block reads as floating-point numbers at all. */
  public static boolean isFloat(byte[] data) {
    return data.length >= 4 && sensible(data, order(data)) == data.length / 4;
  }

  private static int sensible(byte[] data, WordOrder order) {
    int count = 0;
    for (int from = 0; from + 3 < data.length; from += 4) {
      double size = Math.abs(Registers.read(data, from, RawType.FLOAT32, order));
      count += size >= LEAST && size <= MOST ? 1 : 0;
    }
    return count;
  }
}

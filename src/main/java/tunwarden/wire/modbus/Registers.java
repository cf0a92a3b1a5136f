package tunwarden.wire.modbus;

import tunwarden.wire.profile.RawType;
import tunwarden.wire.profile.WordOrder;

/** Numbers in registers: 16 bits each, two bytes, high byte first on the wire. */
public final class Registers {
  private Registers() {}

  /**
   * The number of that type whose bytes begin at {@code from}; there must be enough of them.
   *
   * @throws IndexOutOfBoundsException when there are not
   */
  public static double read(byte[] data, int from, RawType type, WordOrder order) {
    long bits = bits(data, from, type.registers(), order);
    return switch (type) {
      case BIT -> bits & 1;
      case UINT16, UINT32 -> bits;
      case INT16 -> (short) bits;
      case INT32 -> (int) bits;
      case FLOAT32 -> Float.intBitsToFloat((int) bits);
      case FLOAT64 -> Double.longBitsToDouble(bits);
    };
  }

  private static long bits(byte[] data, int from, int words, WordOrder order) {
    long bits = 0;
    for (int i = 0; i < words; i++) {
      int at = from + 2 * (order.lowWordFirst() ? words - 1 - i : i);
      int high = data[order.bytesSwapped() ? at + 1 : at] & 0xFF;
      int low = data[order.bytesSwapped() ? at : at + 1] & 0xFF;
      bits = bits << 16 | high << 8 | low;
    }
    return bits;
  }

  /** Writes a number as {@link #read} reads it; whole types are rounded and held at their ends. */
  public static void write(byte[] data, int from, double number, RawType type, WordOrder order) {
    long bits =
        switch (type) {
          case BIT -> number != 0 ? 1 : 0;
          case UINT16 -> held(number, 0, 0xFFFF);
          case INT16 -> held(number, Short.MIN_VALUE, Short.MAX_VALUE);
          case UINT32 -> held(number, 0, 0xFFFFFFFFL);
          case INT32 -> held(number, Integer.MIN_VALUE, Integer.MAX_VALUE);
          case FLOAT32 -> Float.floatToIntBits((float) number);
          case FLOAT64 -> Double.doubleToLongBits(number);
        };
    int words = type.registers();
    for (int i = 0; i < words; i++) {
      int at = from + 2 * (order.lowWordFirst() ? i : words - 1 - i);
      byte low = (byte) (bits >> 16 * i);
      byte high = (byte) (bits >> 16 * i + 8);
      data[order.bytesSwapped() ? at + 1 : at] = high;
      data[order.bytesSwapped() ? at : at + 1] = low;
    }
  }

  private static long held(double number, long low, long high) {
    return Math.max(low, Math.min(high, Math.round(number)));
  }
}

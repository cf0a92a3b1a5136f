package tunwarden.wire.modbus;

import tunwarden.wire.signal.Crc16;

/**
 * A request to read. There is no way to make one that writes.
 *
 * @param unit address of the instrument, 1 to 247
 * @param function 1 coils, 2 discrete inputs, 3 holding registers, 4 input registers
 * @param address first register or bit, as on the wire, 0 to 65535
 * @param count registers (at most 125) or bits (at most 2000)
 */
public record RtuRequest(int unit, int function, int address, int count) {
  /** Length of a request on the wire, bytes. */
  public static final int BYTES = 8;

  private static final int MOST_REGISTERS = 125;
  private static final int MOST_BITS = 2000;

  /**
   * Refuses what the standard has no room for.
   *
   * @throws IllegalArgumentException with a sentence for the user
   */
  public RtuRequest {
    require(unit >= 1 && unit <= 247, "a Modbus address is 1 to 247, not " + unit);
    require(function >= 1 && function <= 4, "only functions 1 to 4 read, not " + function);
    int most = function <= 2 ? MOST_BITS : MOST_REGISTERS;
    require(count >= 1 && count <= most, "one request reads 1 to " + most + ", not " + count);
    require(
        address >= 0 && address + count <= 0x10000,
        "addresses end at 65535; " + count + " from " + address + " go beyond");
  }

  private static void require(boolean holds, String sentence) {
    if (!holds) {
      throw new IllegalArgumentException(sentence);
    }
  }

  /** The frame, checksum included. */
  public byte[] bytes() {
    byte[] frame = {
      (byte) unit,
      (byte) function,
      (byte) (address >> 8),
      (byte) address,
      (byte) (count >> 8),
      (byte) count,
      0,
      0
    };
    return sealed(frame);
  }

  /** Bytes of data in the answer. */
  public int dataBytes() {
    return function <= 2 ? (count + 7) / 8 : 2 * count;
  }

  /** Puts the checksum into the last two bytes, low byte first. */
  static byte[] sealed(byte[] frame) {
    int crc = Crc16.of(frame, 0, frame.length - 2);
    frame[frame.length - 2] = (byte) crc;
    frame[frame.length - 1] = (byte) (crc >> 8);
    return frame;
  }

  /** Whether the bytes from {@code from} end in the checksum of what stands before it. */
  static boolean isSealed(byte[] bytes, int from, int length) {
    int crc = Crc16.of(bytes, from, length - 2);
    int end = from + length;
    return bytes[end - 2] == (byte) crc && bytes[end - 1] == (byte) (crc >> 8);
  }
}

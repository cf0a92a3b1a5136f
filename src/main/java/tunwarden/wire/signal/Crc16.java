package tunwarden.wire.signal;

/**
 * CRC-16 of Modbus over Serial Line: reflected polynomial A001, start FFFF; sent low byte first.
 */
public final class Crc16 {
  private static final int POLYNOMIAL = 0xA001;
  private static final int[] TABLE = table();

  private Crc16() {}

  /** The checksum of {@code count} bytes from {@code from}. */
  public static int of(byte[] bytes, int from, int count) {
    int crc = 0xFFFF;
    for (int i = from; i < from + count; i++) {
      crc = (crc >>> 8) ^ TABLE[(crc ^ bytes[i]) & 0xFF];
    }
    return crc;
  }

  private static int[] table() {
    int[] table = new int[256];
    for (int i = 0; i < table.length; i++) {
      int crc = i;
      for (int bit = 0; bit < 8; bit++) {
        crc = (crc & 1) != 0 ? (crc >>> 1) ^ POLYNOMIAL : crc >>> 1;
      }
      table[i] = crc;
    }
    return table;
  }
}

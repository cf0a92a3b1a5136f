package tunwarden.wire.profile;

/** Where a value stands in a message. */
public sealed interface Place {
  /** Behind a key in a line of pairs. */
  record Key(String key) implements Place {}

  /** In a column of a line, counted from 1. */
  record Column(int number) implements Place {}

  /**
   * In Modbus registers or bits.
   *
   * @param function 1 coils, 2 discrete inputs, 3 holding registers, 4 input registers
   * @param address as on the wire, counted from 0
   * @param type how the bits are read
   * @param words order of the words of a value longer than one register
   */
  record Register(int function, int address, RawType type, WordOrder words) implements Place {}
}

package tunwarden.wire.profile;

import java.time.Duration;

/**
 * Settings of a serial line.
 *
 * @param baud bit/s
 * @param dataBits 7 or 8
 * @param parity parity bit
 * @param stopBits 1 or 2
 * @param flow flow control
 * @param wires what is done with the modem lines and the RS-485 driver
 * @param settle how long input is thrown away after opening, for boards that restart then
 */
public record LineSettings(
    int baud, int dataBits, Parity parity, int stopBits, Flow flow, Wires wires, Duration settle) {
  /** 9,600 bit/s, 8 data bits, no parity, 1 stop bit: common practice, no source. */
  public static final LineSettings USUAL =
      new LineSettings(9600, 8, Parity.NONE, 1, Flow.NONE, Wires.USUAL, Duration.ZERO);

  /** Parity bit. */
  public enum Parity {
    NONE,
    EVEN,
    ODD
  }

  /** Flow control. */
  public enum Flow {
    NONE,
    RTS_CTS,
    XON_XOFF
  }

  /** Who switches the RS-485 driver. */
  public enum Rs485 {
    /** The adapter does; the port is told that there is none. */
    OFF,
    /** The operating system does. */
    ON,
    /** The port's own mode is left alone. */
    LEAVE
  }

  /**
   * The wires beside the data.
   *
   * @param dtr whether DTR and RTS are raised on opening; lowering them keeps some boards from
   *     restarting
   * @param rs485 who switches the RS-485 driver
   */
  public record Wires(boolean dtr, Rs485 rs485) {
    /** DTR raised, RS-485 left alone. */
    public static final Wires USUAL = new Wires(true, Rs485.LEAVE);
  }

  /** Bits on the wire for one character: start, data, parity, stop. */
  public int bitsPerCharacter() {
    return 1 + dataBits + (parity == Parity.NONE ? 0 : 1) + stopBits;
  }

  /** Time on the wire of a number of characters, nanoseconds. */
  public long nanosFor(int characters) {
    return characters * 1_000_000_000L * bitsPerCharacter() / baud;
  }

  /** As people write it: {@code 9600 8N1}. */
  public String words() {
    return baud + " " + dataBits + parity.name().charAt(0) + stopBits;
  }

  /** The same line at another speed. */
  public LineSettings atBaud(int other) {
    return new LineSettings(other, dataBits, parity, stopBits, flow, wires, settle);
  }
}

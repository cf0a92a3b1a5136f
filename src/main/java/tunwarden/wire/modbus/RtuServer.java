package tunwarden.wire.modbus;

import java.util.function.Function;

/** Answers read requests to one address, for a played instrument. Never throws. */
public final class RtuServer {
  private static final byte[] NOTHING = {};

  private final int unit;
  private final Function<RtuRequest, byte[]> data;
  private final byte[] held = new byte[RtuRequest.BYTES];
  private int length;

  /**
   * A server.
   *
   * @param unit its address
   * @param data the data bytes for a request, or null when there is nothing at that address
   */
  public RtuServer(int unit, Function<RtuRequest, byte[]> data) {
    this.unit = unit;
    this.data = data;
  }

  /** Takes bytes in, keeping the last eight; gives the answer when they are a request to it. */
  public byte[] hear(byte[] bytes, int count) {
    for (int i = 0; i < count; i++) {
      if (length == held.length) {
        System.arraycopy(held, 1, held, 0, --length);
      }
      held[length++] = bytes[i];
      if (length == held.length && isForUs()) {
        length = 0;
        return answer();
      }
    }
    return NOTHING;
  }

  private boolean isForUs() {
    return (held[0] & 0xFF) == unit && RtuRequest.isSealed(held, 0, held.length);
  }

  private byte[] answer() {
    int function = held[1] & 0xFF;
    if (function < 1 || function > 4) {
      return refusal(function, 1);
    }
    RtuRequest request;
    try {
      request = new RtuRequest(unit, function, word(2), word(4));
    } catch (IllegalArgumentException e) {
      return refusal(function, 3);
    }
    byte[] found = data.apply(request);
    if (found == null) {
      return refusal(function, Refusals.NO_SUCH_ADDRESS);
    }
    byte[] frame = new byte[5 + found.length];
    frame[0] = (byte) unit;
    frame[1] = (byte) function;
    frame[2] = (byte) found.length;
    System.arraycopy(found, 0, frame, 3, found.length);
    return RtuRequest.sealed(frame);
  }

  private int word(int at) {
    return (held[at] & 0xFF) << 8 | held[at + 1] & 0xFF;
  }

  private byte[] refusal(int function, int code) {
    return RtuRequest.sealed(new byte[] {(byte) unit, (byte) (function | 0x80), (byte) code, 0, 0});
  }
}

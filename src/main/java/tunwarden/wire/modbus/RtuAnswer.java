package tunwarden.wire.modbus;

import java.util.Arrays;
import tunwarden.reading.Quality;
import tunwarden.wire.ask.Result;
import tunwarden.wire.text.Printable;

/**
 * Finds the answer to one request among the bytes that follow it. The length is known from the
 * request, so no time gaps are looked at. Only a frame whose unit, function, byte count and
 * checksum all match is taken, wherever it begins; an exact echo of the request is skipped once.
 */
final class RtuAnswer {
  /** No frame is longer, so more bytes than this without one are noise. */
  static final int CAP = 256;

  private static final int FRAME = 5;
  private static final int SHOWN = 24;

  private final RtuRequest request;
  private final byte[] echo;
  private final byte[] held = new byte[CAP];
  private int length;
  private boolean echoSkipped;
  private boolean overflowed;

  RtuAnswer(RtuRequest request) {
    this.request = request;
    this.echo = request.bytes();
  }

  /** What was found: the data, or a refusal code, or neither yet. */
  record Found(byte[] data, int code) {}

  /** Takes bytes in; null while there is no answer. */
  Found accept(byte[] bytes, int count) {
    for (int i = 0; i < count; i++) {
      if (length == CAP) {
        overflowed = true;
        return null;
      }
      held[length++] = bytes[i];
      skipEcho();
      Found found = find();
      if (found != null) {
        return found;
      }
    }
    return null;
  }

  private void skipEcho() {
    if (!echoSkipped && length == echo.length && Arrays.equals(held, 0, length, echo, 0, length)) {
      echoSkipped = true;
      length = 0;
    }
  }

  /** A frame can only end at the last byte, since it is looked for at every byte. */
  private Found find() {
    int whole = FRAME + request.dataBytes();
    int from = length - whole;
    if (from >= 0 && isHead(from, request.function(), request.dataBytes())) {
      if (RtuRequest.isSealed(held, from, whole)) {
        return new Found(Arrays.copyOfRange(held, from + 3, from + whole - 2), 0);
      }
    }
    from = length - FRAME;
    if (from >= 0 && isHead(from, request.function() | 0x80, held[from + 2] & 0xFF)) {
      if (RtuRequest.isSealed(held, from, FRAME)) {
        return new Found(null, held[from + 2] & 0xFF);
      }
    }
    return null;
  }

  private boolean isHead(int from, int function, int third) {
    return (held[from] & 0xFF) == request.unit()
        && (held[from + 1] & 0xFF) == function
        && (held[from + 2] & 0xFF) == third;
  }

  /** Why there is no answer. */
  Result.Failure late() {
    if (length == 0 && !overflowed) {
      String seen = echoSkipped ? "only the echo of the request came" : "nothing came";
      return new Result.Failure(Quality.NO_ANSWER, "unit " + request.unit() + ": " + seen);
    }
    String seen = "unit " + request.unit() + ": " + Printable.hex(held, length, SHOWN);
    if (overflowed) {
      return new Result.Failure(Quality.UNREADABLE, seen + " (over " + CAP + " bytes of noise)");
    }
    boolean whole = length >= FRAME + request.dataBytes();
    boolean ours = isHead(0, request.function(), request.dataBytes());
    Quality quality = whole && ours ? Quality.CHECKSUM : Quality.UNREADABLE;
    return new Result.Failure(quality, seen);
  }
}

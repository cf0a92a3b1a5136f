package tunwarden.serial;

import java.time.Instant;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.text.Printable;

/** Counts of one line; written by its thread alone. */
final class Tally {
  private static final int TAIL = 96;

  private final boolean binary;
  private final Map<Trouble, Long> troubles = new EnumMap<>(Trouble.class);
  private final byte[] tail = new byte[TAIL];
  private int tailLength;
  private long bytes;
  private long messages;
  private long dropped;
  private Instant lastBytesAt;
  private String lastTrouble = "";
  private Instant lastTroubleAt;

  Tally(Speaks speaks) {
    this.binary = speaks == Speaks.MODBUS_RTU;
  }

  void received(byte[] buffer, int count, Instant now) {
    bytes += count;
    lastBytesAt = now;
    int fresh = Math.min(count, TAIL);
    int kept = Math.min(tailLength, TAIL - fresh);
    System.arraycopy(tail, tailLength - kept, tail, 0, kept);
    System.arraycopy(buffer, count - fresh, tail, kept, fresh);
    tailLength = kept + fresh;
  }

  void message() {
    messages++;
  }

  void dropped(long count) {
    dropped += count;
  }

  void trouble(Trouble trouble, String detail, Instant now) {
    troubles.merge(trouble, 1L, Long::sum);
    lastTrouble = detail.isEmpty() ? trouble.words() : trouble.words() + ": " + detail;
    lastTroubleAt = now;
  }

  long bytes() {
    return bytes;
  }

  long messages() {
    return messages;
  }

  LinkHealth.Traffic snapshot() {
    byte[] last = Arrays.copyOf(tail, tailLength);
    return new LinkHealth.Traffic(
        bytes,
        messages,
        dropped,
        lastBytesAt,
        binary ? Printable.hex(last, tailLength, TAIL) : Printable.of(last, tailLength, TAIL),
        Map.copyOf(troubles),
        lastTrouble,
        lastTroubleAt);
  }
}

package tunwarden.estimate;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.TreeMap;
import java.util.zip.CRC32;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.Medium;
import tunwarden.physics.liquid.Liquid;
import tunwarden.vessel.Vessel;

/**
 * The standard estimator's state as bytes and back, every digit kept: what follows after coming
 * back is bit for bit what would have followed without. Open events, which the journal has, are
 * kept as well. A checksum covers the whole and the vessel's description.
 */
public final class StateCodec {
  private static final int MAGIC = 0x54574532;
  private static final int ROOM = 16_384;

  private StateCodec() {}

  /**
   * The state as bytes, at most 64 KiB.
   *
   * @throws IllegalArgumentException when the state is not the standard estimator's
   */
  public static byte[] encode(State state) {
    if (!(state instanceof BankState bank)) {
      throw new IllegalArgumentException("only a state of the standard estimator can be kept");
    }
    ByteBuffer out = ByteBuffer.allocate(Bank.bytes() + ROOM);
    out.putInt(MAGIC).putLong(description(bank.medium().vessel()));
    StateWriter writer = new StateWriter(out);
    writer.senses(bank.senses());
    writer.watch(bank.watch());
    writer.book(bank.book());
    writer.flag(bank.bank() != null);
    if (bank.bank() != null) {
      writer.front(bank.front());
      bank.bank().write(out);
    }
    writer.flag(bank.estimate().isPresent());
    bank.estimate().ifPresent(writer::estimate);
    out.putLong(checksum(out.array(), out.position()));
    byte[] bytes = new byte[out.position()];
    System.arraycopy(out.array(), 0, bytes, 0, bytes.length);
    return bytes;
  }

  /**
   * The state that was kept for this vessel.
   *
   * @throws IllegalArgumentException when the bytes are damaged, of another form, or belong to a
   *     vessel described otherwise; the message is one sentence
   */
  public static State decode(Vessel vessel, byte[] bytes) {
    if (bytes.length < 3 * Long.BYTES
        || checksum(bytes, bytes.length - Long.BYTES)
            != ByteBuffer.wrap(bytes).getLong(bytes.length - Long.BYTES)) {
      throw new IllegalArgumentException("the kept state is damaged; the estimate starts afresh");
    }
    ByteBuffer in = ByteBuffer.wrap(bytes);
    if (in.getInt() != MAGIC) {
      throw new IllegalArgumentException(
          "the kept state is of another version; the estimate starts afresh");
    }
    if (in.getLong() != description(vessel)) {
      throw new IllegalArgumentException(
          "the kept state belongs to a vessel described otherwise; the estimate starts afresh");
    }
    try {
      return read(vessel, in);
    } catch (BufferUnderflowException e) {
      throw new IllegalArgumentException("the kept state is cut short", e);
    }
  }

  private static State read(Vessel vessel, ByteBuffer in) {
    StateReader reader = new StateReader(in);
    Senses senses = reader.senses();
    Watch watch = reader.watch();
    EventBook book = reader.book();
    Front front = null;
    Bank bank = null;
    if (reader.flag()) {
      front = reader.front();
      bank = Bank.read(in);
    }
    Optional<Estimate> estimate = reader.flag() ? Optional.of(reader.estimate()) : Optional.empty();
    return new BankState(new Medium(vessel), senses, front, bank, watch, book, estimate);
  }

  /** Of everything the belief rests on; salts in a fixed order. */
  private static long description(Vessel vessel) {
    Liquid liquid = vessel.liquid();
    String words =
        String.join(
            "|",
            vessel.id(),
            vessel.volumeM3() + "," + vessel.fillM3(),
            liquid.kind() + "," + liquid.beerMethod() + "," + liquid.alcoholByVolume(),
            liquid.extractPlato() + "," + liquid.sugarKgPerM3(),
            new TreeMap<>(liquid.saltMolPerM3()).toString(),
            vessel.gas() + "," + vessel.contents().airPaAbsolute(),
            vessel.closure() + "," + vessel.accuracy() + "," + vessel.site().ambientPaAbsolute());
    byte[] bytes = words.getBytes(StandardCharsets.UTF_8);
    return checksum(bytes, bytes.length);
  }

  private static long checksum(byte[] bytes, int length) {
    CRC32 crc = new CRC32();
    crc.update(bytes, 0, length);
    return crc.getValue();
  }
}

package tunwarden.replay;

import java.io.IOException;
import java.io.InputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;
import java.util.function.LongConsumer;

/** Hashes what passes, so that a file need not be read a second time for that. */
final class HashedInput extends MeteredInput {
  private static final int BUFFER = 1 << 16;

  private final MessageDigest digest;

  HashedInput(InputStream in, LongConsumer progress) {
    super(in, progress);
    try {
      this.digest = MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  @Override
  public int read(byte[] bytes, int offset, int length) throws IOException {
    int got = super.read(bytes, offset, length);
    if (got > 0) {
      digest.update(bytes, offset, got);
    }
    return got;
  }

  /** SHA-256, hexadecimal, of the whole: what nobody has read yet is read now. */
  @Override
  Optional<String> hash() throws IOException {
    byte[] rest = new byte[BUFFER];
    int got = 0;
    while (got >= 0) {
      got = read(rest, 0, rest.length);
    }
    return Optional.of(HexFormat.of().formatHex(digest.digest()));
  }
}

package tunwarden.replay;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Optional;
import java.util.function.LongConsumer;

/** Counts what is taken from the disk, before any unpacking. */
class MeteredInput extends FilterInputStream {
  private final LongConsumer progress;
  private long total;

  MeteredInput(InputStream in, LongConsumer progress) {
    super(in);
    this.progress = progress;
  }

  @Override
  public int read() throws IOException {
    byte[] one = new byte[1];
    return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
  }

  @Override
  public int read(byte[] bytes, int offset, int length) throws IOException {
    int got = super.read(bytes, offset, length);
    if (got > 0) {
      total += got;
      progress.accept(total);
    }
    return got;
  }

  /** Hash of the whole, if this stream makes one. */
  Optional<String> hash() throws IOException {
    return Optional.empty();
  }
}

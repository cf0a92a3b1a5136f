package tunwarden.screen.terminal;

import java.io.IOException;
import java.io.InputStream;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;

/**
 * Input whose {@link #available()} tells the truth, read ahead by a thread. The key decoder polls
 * it, and JLine's own stream always answers zero. Carriage return becomes line feed, without which
 * the decoder waits for more after Enter.
 */
final class PumpedInput extends InputStream {
  private static final int CAPACITY = 4_096;
  private static final int END = -1;

  private final BlockingQueue<Integer> read = new ArrayBlockingQueue<>(CAPACITY);
  private volatile boolean ended;

  PumpedInput(InputStream from) {
    Thread pump = new Thread(() -> pump(from), "console input");
    pump.setDaemon(true);
    pump.start();
  }

  private void pump(InputStream from) {
    try {
      int next = from.read();
      while (next >= 0) {
        read.put(next == '\r' ? '\n' : next);
        next = from.read();
      }
    } catch (IOException gone) {
      // A console that fails has ended.
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } finally {
      ended = true;
      read.offer(END);
    }
  }

  @Override
  public int available() {
    return ended && read.isEmpty() ? 1 : read.size();
  }

  @Override
  public int read() throws IOException {
    if (ended && read.isEmpty()) {
      return END;
    }
    try {
      return read.take();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IOException("interrupted while waiting for a key", e);
    }
  }

  @Override
  public int read(byte[] into, int offset, int length) throws IOException {
    if (length == 0) {
      return 0;
    }
    int first = read();
    if (first < 0) {
      return END;
    }
    into[offset] = (byte) first;
    int count = 1;
    while (count < length && read.peek() != null && read.peek() >= 0) {
      into[offset + count++] = (byte) (int) read.poll();
    }
    return count;
  }
}

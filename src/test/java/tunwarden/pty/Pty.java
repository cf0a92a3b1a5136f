package tunwarden.pty;

import com.sun.jna.LastErrorException;
import com.sun.jna.Library;
import com.sun.jna.Native;
import com.sun.jna.Platform;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Assumptions;

/**
 * A pseudo-terminal pair: the program under test opens the slave as a serial port, the test plays
 * the instrument on the master. A link of a fixed name leads to the slave, so that a new pair can
 * take its place as a replugged adapter does. Closing the master is pulling the plug.
 */
public final class Pty implements AutoCloseable {
  private static final int O_RDWR = 2;
  private static final int O_NOCTTY = 0x100;
  private static final int POLL_IN = 1;
  private static final int TERMIOS_BYTES = 128;

  private final Path link;
  private int master = -1;

  /** The handful of C functions that make a pair. */
  interface C extends Library {
    int posix_openpt(int flags) throws LastErrorException;

    int grantpt(int fd) throws LastErrorException;

    int unlockpt(int fd) throws LastErrorException;

    int ptsname_r(int fd, byte[] name, long length) throws LastErrorException;

    int tcgetattr(int fd, byte[] termios) throws LastErrorException;

    void cfmakeraw(byte[] termios);

    int tcsetattr(int fd, int when, byte[] termios) throws LastErrorException;

    long read(int fd, byte[] bytes, long count) throws LastErrorException;

    long write(int fd, byte[] bytes, long count) throws LastErrorException;

    int poll(byte[] fds, long count, int timeoutMs) throws LastErrorException;

    int close(int fd) throws LastErrorException;
  }

  private static final class Loaded {
    private static final C LIBRARY = Native.load("c", C.class);
  }

  private Pty(Path link) {
    this.link = link;
  }

  /** A pair that is not there yet: the link leads nowhere. Skips the test where there are none. */
  public static Pty unplugged(Path folder) {
    Assumptions.assumeTrue(Platform.isLinux(), "skipped: pseudo-terminals need Linux");
    return new Pty(folder.resolve("port"));
  }

  /** A pair that is there. */
  public static Pty plugged(Path folder) {
    Pty pty = unplugged(folder);
    pty.plug();
    return pty;
  }

  /** The name the program under test opens. */
  public String port() {
    return link.toString();
  }

  /** Makes a fresh pair and lets the link lead to it. */
  public void plug() {
    C c = Loaded.LIBRARY;
    master = c.posix_openpt(O_RDWR | O_NOCTTY);
    c.grantpt(master);
    c.unlockpt(master);
    byte[] name = new byte[64];
    c.ptsname_r(master, name, name.length);
    byte[] termios = new byte[TERMIOS_BYTES];
    c.tcgetattr(master, termios);
    c.cfmakeraw(termios);
    c.tcsetattr(master, 0, termios);
    try {
      Files.deleteIfExists(link);
      Files.createSymbolicLink(link, Path.of(Native.toString(name)));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Pulls the plug: the slave hangs up and the name is gone. */
  public void unplug() {
    try {
      Files.deleteIfExists(link);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    if (master >= 0) {
      Loaded.LIBRARY.close(master);
      master = -1;
    }
  }

  /** Sends bytes as the instrument. */
  public void send(byte[] bytes) {
    int done = 0;
    while (done < bytes.length) {
      byte[] rest = java.util.Arrays.copyOfRange(bytes, done, bytes.length);
      done += (int) Loaded.LIBRARY.write(master, rest, rest.length);
    }
  }

  /** Sends text as the instrument. */
  public void send(String text) {
    send(text.getBytes(StandardCharsets.ISO_8859_1));
  }

  /** What the program sent, waiting for the first byte at most so long; empty when nothing came. */
  public byte[] receive(int waitMs) {
    byte[] fds = new byte[8];
    java.nio.ByteBuffer.wrap(fds)
        .order(java.nio.ByteOrder.nativeOrder())
        .putInt(master)
        .putShort((short) POLL_IN);
    if (Loaded.LIBRARY.poll(fds, 1, waitMs) <= 0 || (fds[6] & POLL_IN) == 0) {
      return new byte[0];
    }
    byte[] buffer = new byte[512];
    int count = (int) Loaded.LIBRARY.read(master, buffer, buffer.length);
    return java.util.Arrays.copyOf(buffer, Math.max(0, count));
  }

  @Override
  public void close() {
    unplug();
  }
}

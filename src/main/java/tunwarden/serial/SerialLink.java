package tunwarden.serial;

import com.fazecast.jSerialComm.SerialPort;
import java.util.Arrays;

/**
 * One opening of one port. After an unplug the library goes on saying "open", reads −1 and writes
 * fewer bytes than asked, or none: both mean the port is gone, and this object with it.
 */
final class SerialLink implements ByteLink {
  private static final int POLL_MS = 2;

  private final String name;
  private final SerialPort port;
  private final ByteLinkFactory.Use use;
  private boolean closed;

  SerialLink(String name, SerialPort port, ByteLinkFactory.Use use) {
    this.name = name;
    this.port = port;
    this.use = use;
  }

  @Override
  public int read(byte[] buffer, int waitMs) throws PortException {
    long deadline = System.nanoTime() + waitMs * 1_000_000L;
    while (true) {
      int count = port.readBytes(buffer, buffer.length);
      if (count < 0) {
        throw gone();
      }
      if (count > 0 || System.nanoTime() - deadline >= 0) {
        return count;
      }
      if (use == ByteLinkFactory.Use.ASK && !sleep()) {
        return 0;
      }
    }
  }

  private static boolean sleep() {
    try {
      Thread.sleep(POLL_MS);
      return true;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return false;
    }
  }

  @Override
  public void write(byte[] bytes) throws PortException {
    int sent = 0;
    for (int tries = 0; sent < bytes.length; tries++) {
      byte[] rest = Arrays.copyOfRange(bytes, sent, bytes.length);
      int count = port.writeBytes(rest, rest.length);
      if (count <= 0 || tries > bytes.length) {
        throw gone();
      }
      sent += count;
    }
  }

  private PortException gone() {
    return new PortException(PortException.Reason.GONE, name + " has gone; is it plugged in?");
  }

  @Override
  public void close() {
    if (!closed) {
      closed = true;
      port.closePort();
    }
  }
}

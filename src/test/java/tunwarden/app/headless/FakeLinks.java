package tunwarden.app.headless;

import java.nio.charset.StandardCharsets;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import tunwarden.serial.ByteLink;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.PortException;
import tunwarden.wire.profile.LineSettings;

/** Ports on which an instrument sends {@code P=… T=…} lines as often as it is told to. */
final class FakeLinks implements ByteLinkFactory {
  final Set<String> unplugged = ConcurrentHashMap.newKeySet();
  private final int everyMs;
  private volatile double bar;

  FakeLinks(double bar, int everyMs) {
    this.bar = bar;
    this.everyMs = everyMs;
  }

  void set(double barGauge) {
    bar = barGauge;
  }

  @Override
  public ByteLink open(String port, LineSettings settings, Use use) throws PortException {
    if (unplugged.contains(port)) {
      throw new PortException(PortException.Reason.ABSENT, "the port " + port + " is not there");
    }
    return new Link(port);
  }

  private final class Link implements ByteLink {
    private final String port;
    private long due = System.nanoTime();

    Link(String port) {
      this.port = port;
    }

    @Override
    public int read(byte[] buffer, int waitMs) throws PortException {
      long waited = Math.min(waitMs, Math.max(1, (due - System.nanoTime()) / 1_000_000));
      try {
        Thread.sleep(waited);
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
      }
      if (unplugged.contains(port)) {
        throw new PortException(PortException.Reason.GONE, "the port " + port + " is gone");
      }
      if (System.nanoTime() < due) {
        return 0;
      }
      due += everyMs * 1_000_000L;
      byte[] line = ("P=" + bar + " T=5.25\r\n").getBytes(StandardCharsets.US_ASCII);
      System.arraycopy(line, 0, buffer, 0, line.length);
      return line.length;
    }

    @Override
    public void write(byte[] bytes) {
      throw new UnsupportedOperationException("nobody writes to a listening instrument");
    }

    @Override
    public void close() {
      // Nothing is held.
    }
  }
}

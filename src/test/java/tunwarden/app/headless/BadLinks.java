package tunwarden.app.headless;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.DoubleSupplier;
import tunwarden.serial.ByteLink;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.PortException;
import tunwarden.wire.profile.LineSettings;

/**
 * Ports on which instruments speak and now and then send values that are no numbers, noise, or
 * hundreds of lines at once; and whose plugs are pulled.
 */
final class BadLinks implements ByteLinkFactory {
  private static final int FLOOD = 300;

  final Set<String> unplugged = ConcurrentHashMap.newKeySet();
  private final DoubleSupplier bar;
  private final int everyMs;

  /**
   * Instruments that tell a pressure.
   *
   * @param bar what they tell, bar gauge
   * @param everyMs a line each
   */
  BadLinks(DoubleSupplier bar, int everyMs) {
    this.bar = bar;
    this.everyMs = everyMs;
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
    private final SplittableRandom random;
    private long due = System.nanoTime();
    private int flood;

    Link(String port) {
      this.port = port;
      this.random = new SplittableRandom(port.hashCode());
    }

    @Override
    public int read(byte[] buffer, int waitMs) throws PortException {
      if (unplugged.contains(port)) {
        throw new PortException(PortException.Reason.GONE, "the port " + port + " is gone");
      }
      if (flood == 0) {
        long wait = Math.min(waitMs, Math.max(1, (due - System.nanoTime()) / 1_000_000));
        try {
          Thread.sleep(wait);
        } catch (InterruptedException e) {
          Thread.currentThread().interrupt();
        }
        if (System.nanoTime() < due) {
          return 0;
        }
        due = System.nanoTime() + everyMs * 1_000_000L;
        flood = random.nextInt(500) == 0 ? FLOOD : 0;
      } else {
        flood--;
      }
      byte[] line = line().getBytes(StandardCharsets.ISO_8859_1);
      int count = Math.min(line.length, buffer.length);
      System.arraycopy(line, 0, buffer, 0, count);
      return count;
    }

    private String line() {
      return switch (random.nextInt(60)) {
        case 0 -> "P=NaN T=5.25\r\n";
        case 1 -> "P=Infinity T=-Infinity\r\n";
        case 2 -> "\u00ff\u0000\u001b[2J~~P=\r\n";
        default -> {
          double noisy = bar.getAsDouble() + random.nextDouble(-0.002, 0.002);
          yield String.format(Locale.ROOT, "P=%.4f T=5.25\r\n", noisy);
        }
      };
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

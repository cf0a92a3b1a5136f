package tunwarden.terminal;

import java.util.concurrent.TimeUnit;
import tunwarden.pty.Pty;

/** A gauge that sends a line every fifth of a second for as long as it is plugged in. */
final class Feeder implements AutoCloseable {
  private static final long EVERY_MS = 200;

  private final Pty pty;
  private final Thread thread = new Thread(this::feed, "gauge");
  private boolean plugged = true;
  private volatile boolean closing;

  Feeder(Pty pty) {
    this.pty = pty;
  }

  void start() {
    thread.start();
  }

  synchronized void unplug() {
    plugged = false;
    pty.unplug();
  }

  synchronized void plug() {
    pty.plug();
    plugged = true;
  }

  private void feed() {
    while (!closing) {
      synchronized (this) {
        if (plugged) {
          pty.send("P=0.873 T=5.25\n");
        }
      }
      try {
        TimeUnit.MILLISECONDS.sleep(EVERY_MS);
      } catch (InterruptedException e) {
        return;
      }
    }
  }

  @Override
  public void close() {
    closing = true;
    try {
      thread.join();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}

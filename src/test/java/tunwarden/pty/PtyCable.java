package tunwarden.pty;

import java.nio.file.Path;

/**
 * Two pseudo-terminals whose masters are joined, so that two programs that each open a serial port
 * hear each other as over a null-modem cable.
 */
public final class PtyCable implements AutoCloseable {
  private final Pty near;
  private final Pty far;
  private final Thread there;
  private final Thread back;
  private volatile boolean closing;

  /** Lays a cable with both ends in folders of their own. */
  public PtyCable(Path nearFolder, Path farFolder) {
    near = Pty.plugged(nearFolder);
    far = Pty.plugged(farFolder);
    there = carrying(near, far);
    back = carrying(far, near);
  }

  private Thread carrying(Pty from, Pty to) {
    Thread thread =
        new Thread(
            () -> {
              while (!closing) {
                byte[] bytes = from.receive(20);
                if (bytes.length > 0) {
                  to.send(bytes);
                } else {
                  pause();
                }
              }
            },
            "cable");
    thread.start();
    return thread;
  }

  /** A master whose slave nobody has open reports a hang-up at once; do not spin on it. */
  private static void pause() {
    try {
      Thread.sleep(2);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  /** The port for the program under test. */
  public String near() {
    return near.port();
  }

  /** The port for its peer. */
  public String far() {
    return far.port();
  }

  @Override
  public void close() {
    closing = true;
    try {
      there.join(2000);
      back.join(2000);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    near.close();
    far.close();
  }
}

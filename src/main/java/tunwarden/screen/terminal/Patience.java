package tunwarden.screen.terminal;

import java.io.IOException;

/** Work on the terminal that is given up when the terminal stalls. */
final class Patience {
  private static final long MOST_MS = 2_000;

  private Patience() {}

  /** Something that may block or fail. */
  interface Work {
    void run() throws IOException;
  }

  /** Does the work on a thread of its own and waits for it for a bounded time. */
  static void within(String name, Work work) {
    Thread thread =
        new Thread(
            () -> {
              try {
                work.run();
              } catch (IOException | IllegalStateException ignored) {
                // The terminal is gone; there is nobody left to tell.
              }
            },
            name);
    thread.setDaemon(true);
    thread.start();
    await(thread);
  }

  /** Waits a bounded time for a thread to end, also when the caller has been interrupted. */
  static void await(Thread thread) {
    boolean interrupted = Thread.interrupted();
    try {
      thread.join(MOST_MS);
    } catch (InterruptedException e) {
      interrupted = true;
    }
    if (interrupted) {
      Thread.currentThread().interrupt();
    }
  }
}

package tunwarden.app.headless;

import java.io.IOException;
import java.io.PrintWriter;
import java.time.InstantSource;
import java.util.concurrent.CountDownLatch;
import tunwarden.app.keeping.Signals;
import tunwarden.serial.SerialLinks;

/** Keeps {@link Headless} running until the process is told to end. */
public final class HeadlessRun {
  private HeadlessRun() {}

  /** Starts, waits for SIGTERM or Ctrl-C, and ends cleanly. */
  public static void untilStopped(HeadlessPlan plan, InstantSource clock, PrintWriter out)
      throws IOException {
    Headless headless =
        new Headless(
            plan,
            new SerialLinks(),
            clock,
            line -> {
              out.println(line);
              out.flush();
            });
    SerialLinks.load();
    headless.start();
    CountDownLatch stopped = new CountDownLatch(1);
    // Ending begins here, before the virtual machine's own shutdown: the serial library closes its
    // ports in a shutdown hook, which would look like a pulled plug.
    Signals.on("TERM", stopped::countDown);
    Signals.on("INT", stopped::countDown);
    Signals.onHangUp(headless::reload);
    Runtime.getRuntime().addShutdownHook(new Thread(headless::close, "stop"));
    try {
      stopped.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    headless.close();
  }
}

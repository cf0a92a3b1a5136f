package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.OperatingSystemMXBean;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.InstantSource;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Two hundred vessels at one reading a second each, with everything on: ports, estimator,
 * forecasts, alarms, recording, HTTP. Processor time, not elapsed time, is measured, so that other
 * work on the machine counts little.
 */
@Tag("long")
class LoadTest {
  private static final int VESSELS = 200;
  private static final int PER_PORT = 10;
  private static final Duration WARM_UP = Duration.ofSeconds(60);
  private static final Duration MEASURED = Duration.ofSeconds(60);
  private static final double MOST_OF_ONE_CORE = 0.20;
  private static final long MOST_HEAP = 256L << 20;

  @TempDir private Path folder;

  @Test
  void twoHundredVesselsLeaveTheMachineAlone() throws Exception {
    Path cellar = folder.resolve("cellar.toml");
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < VESSELS; i++) {
      text.append(vessel("FV" + i, "/dev/line" + i / PER_PORT));
    }
    Files.writeString(cellar, text);
    HeadlessPlan plan =
        new HeadlessPlan(
            cellar,
            folder.resolve("data"),
            Optional.of(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0)),
            Optional.empty());
    try (Headless headless =
        new Headless(plan, new FakeLinks(0.873, 1000), InstantSource.system(), line -> {})) {
      headless.start();
      TimeUnit.SECONDS.sleep(WARM_UP.toSeconds());
      OperatingSystemMXBean system =
          ManagementFactory.getPlatformMXBean(OperatingSystemMXBean.class);
      long cpuBefore = system.getProcessCpuTime();
      long begun = System.nanoTime();
      TimeUnit.SECONDS.sleep(MEASURED.toSeconds());
      double share =
          (double) (system.getProcessCpuTime() - cpuBefore) / (System.nanoTime() - begun);
      System.gc();
      long heap = ManagementFactory.getMemoryMXBean().getHeapMemoryUsage().getUsed();
      long resident = residentKib() >> 10;
      System.out.printf(
          "%d vessels at 1 Hz: %.1f %% of one core, %d MiB of heap in use, %d MiB resident with"
              + " the test itself%n",
          VESSELS, 100 * share, heap >> 20, resident);
      assertEquals(0, headless.ailments().size(), headless.ailments()::toString);
      assertTrue(share < MOST_OF_ONE_CORE, "share of one core: " + share);
      assertTrue(heap < MOST_HEAP, "heap in use: " + heap);
    }
  }

  /** Memory of the process as the system counts it; 0 where it does not say. */
  private static long residentKib() throws IOException {
    Path status = Path.of("/proc/self/status");
    if (!Files.exists(status)) {
      return 0;
    }
    return Files.readAllLines(status).stream()
        .filter(line -> line.startsWith("VmRSS:"))
        .mapToLong(line -> Long.parseLong(line.replaceAll("\\D", "")))
        .findFirst()
        .orElse(0);
  }

  private static String vessel(String id, String port) {
    return """
        [vessel.%s]
        volume = "2000 L"
        fill = "1800 L"
        liquid = { kind = "beer" }
        limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
        [vessel.%s.readings]
        pressure = { device = "text-line", port = "%s", field = "P" }
        temperature = { device = "text-line", port = "%s", field = "T" }
        """
        .formatted(id, id, port, port);
  }
}

package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.config.profile.Profiles;
import tunwarden.pty.Pty;
import tunwarden.serial.ScriptedSlave.Piece;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.simulate.PlayedInstrument;

/** What a port costs: processor time, file descriptors, threads. */
class PortCostsTest {
  private static final int SECONDS = 6;
  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

  @TempDir private Path folder;

  /** Shares of one core that the threads of ports used over some seconds, after a warm-up. */
  private static double[] shares(String... ports) {
    Eventually.sleep(2000);
    double[] shares = new double[ports.length];
    for (int i = 0; i < ports.length; i++) {
      shares[i] = -cpuNanos(ports[i]) / (SECONDS * 1e9);
    }
    Eventually.sleep(SECONDS * 1000);
    for (int i = 0; i < ports.length; i++) {
      shares[i] += cpuNanos(ports[i]) / (SECONDS * 1e9);
    }
    return shares;
  }

  private static long cpuNanos(String port) {
    long sum = 0;
    for (Thread thread : Thread.getAllStackTraces().keySet()) {
      if (thread.getName().equals("port " + port)) {
        sum += THREADS.getThreadCpuTime(thread.getId());
      }
    }
    return sum;
  }

  @Test
  @SuppressWarnings("try")
  void aPortAtOneHertzUsesNoMoreThanOnePerCentOfACore() throws IOException {
    Profile scaled = Profiles.find("modbus-rtu-scaled", folder);
    PlayedInstrument instrument = PlayedInstrument.of(scaled, 1);
    instrument.show(Map.of("pressure", 87_300.0, "temperature", 280.0));
    Path other = Files.createDirectory(folder.resolve("other"));
    try (Pty asked = Pty.plugged(folder);
        Pty streaming = Pty.plugged(other);
        ScriptedSlave slave =
            new ScriptedSlave(asked, r -> List.of(new Piece(20, instrument.hear(r, r.length))));
        Watching one = new Watching(asked.port(), Watching.unit(scaled, 1));
        Watching two = new Watching(streaming.port(), streamed())) {
      Thread speaking = new Thread(() -> speak(streaming));
      speaking.start();
      double[] shares = shares(asked.port(), streaming.port());
      double asking = shares[0];
      double listening = shares[1];
      speaking.interrupt();
      System.out.printf("share of a core: asking %.4f, listening %.4f%n", asking, listening);
      assertTrue(one.readings(r -> true).size() >= 10, "asked too little to be measured");
      assertTrue(two.readings(r -> true).size() >= 10, "heard too little to be measured");
      assertTrue(asking > 0 && asking <= 0.01, "asking took " + asking);
      assertTrue(listening > 0 && listening <= 0.01, "listening took " + listening);
    }
  }

  private List<tunwarden.wire.profile.Binding> streamed() {
    Profile lines = Profiles.find("checksummed-line-crc", folder);
    return Watching.unit(lines, 0);
  }

  private void speak(Pty pty) {
    PlayedInstrument instrument =
        PlayedInstrument.of(Profiles.find("checksummed-line-crc", folder), 0);
    instrument.show(Map.of("P", 87_300.0, "T", 280.0));
    while (!Thread.currentThread().isInterrupted()) {
      pty.send(instrument.speak());
      Eventually.sleep(1000);
    }
  }

  private static long descriptors() throws IOException {
    try (Stream<Path> open = Files.list(Path.of("/proc/self/fd"))) {
      return open.count();
    }
  }

  @Test
  void aThousandOpeningsLeaveNothingBehind() throws Exception {
    try (Pty pty = Pty.plugged(folder)) {
      SerialLinks links = new SerialLinks();
      byte[] buffer = new byte[16];
      List<Long> descriptors = new ArrayList<>();
      List<Integer> threads = new ArrayList<>();
      for (int i = 0; i <= 1000; i++) {
        try (ByteLink link = links.open(pty.port(), LineSettings.USUAL, ByteLinkFactory.Use.ASK)) {
          link.read(buffer, 0);
        }
        if (i % 500 == 0) {
          descriptors.add(descriptors());
          threads.add(THREADS.getThreadCount());
        }
      }
      System.out.println("descriptors " + descriptors + ", threads " + threads);
      assertTrue(descriptors.get(2) <= descriptors.get(0) + 2, descriptors::toString);
      assertTrue(threads.get(2) <= threads.get(0) + 2, threads::toString);
    }
  }

  private void runners(int cycles) throws IOException {
    try (Pty pty = Pty.plugged(folder)) {
      long before = 0;
      int threads = 0;
      for (int i = 0; i <= cycles; i++) {
        try (Watching watching = new Watching(pty.port(), streamed())) {
          Eventually.within(
              Duration.ofSeconds(5), "open", () -> watching.health().state().isOpen());
        }
        if (i == 0) {
          before = descriptors();
          threads = THREADS.getThreadCount();
        }
      }
      assertTrue(descriptors() <= before + 2, () -> "descriptors grew");
      assertTrue(THREADS.getThreadCount() <= threads + 2, () -> "threads grew");
    }
  }

  @Test
  void runnersThatStartAndStopLeaveNothingBehind() throws IOException {
    runners(20);
  }

  @Test
  @Tag("long")
  void aThousandRunnersLeaveNothingBehind() throws IOException {
    runners(1000);
  }
}

package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.sun.net.httpserver.HttpServer;
import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentSkipListSet;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalLines;
import tunwarden.journal.JournalReader;
import tunwarden.journal.disk.RealDisk;

/**
 * The whole program under a clock that runs many times too fast: ports unplugged every hour, values
 * that are no numbers, noise, floods, a clock put back an hour, the cellar file read again, pages
 * asked for, word sent by webhook. Nothing may grow, and no alarm may be lost: the journal's
 * numbers have no gap, each alarm's states follow one from the other, and word of every raise was
 * sent.
 */
class SoakTest {
  private static final Instant BEGIN = Instant.parse("2026-03-02T06:00:00Z");
  private static final int VESSELS = 3;
  private static final long ALLOWED_GROWTH = 12L << 20;
  private static final int SCRAPE_EVERY = 20;

  /** Workers of the HTTP server and connections that stand open; a leak grows by the hour. */
  private static final int SPARE = 8;

  private static final String UNACKNOWLEDGED = "unacknowledged";

  @TempDir private Path folder;
  private final Set<Long> sent = new ConcurrentSkipListSet<>();
  private FastClock clock;
  private BadLinks links;
  private int unplugged;

  @Test
  void twoHoursWithFaults() throws Exception {
    soak(2, 600);
  }

  @Test
  @Tag("long")
  void aDayWithFaults() throws Exception {
    soak(24, 240);
  }

  private record Use(long heap, long threads, long descriptors) {
    /** At rest: connections that were just used are given time to close. */
    static Use now() throws IOException, InterruptedException {
      Use least = once();
      for (int i = 0; i < 8; i++) {
        TimeUnit.MILLISECONDS.sleep(250);
        Use next = once();
        least =
            new Use(
                Math.min(least.heap(), next.heap()),
                Math.min(least.threads(), next.threads()),
                Math.min(least.descriptors(), next.descriptors()));
      }
      return least;
    }

    private static Use once() throws IOException {
      System.gc();
      Runtime runtime = Runtime.getRuntime();
      Path open = Path.of("/proc/self/fd");
      long descriptors = 0;
      if (Files.isDirectory(open)) {
        try (Stream<Path> all = Files.list(open)) {
          descriptors = all.count();
        }
      }
      return new Use(
          runtime.totalMemory() - runtime.freeMemory(), Thread.activeCount(), descriptors);
    }
  }

  private static String vessel(int i) {
    return """
        [vessel.FV%1$d]
        volume = "2000 L"
        fill = "1800 L"
        liquid = { kind = "beer" }
        limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
        [vessel.FV%1$d.readings]
        pressure = { device = "text-line", port = "/dev/line%1$d", field = "P" }
        temperature = { device = "text-line", port = "/dev/line%1$d", field = "T" }
        """
        .formatted(i);
  }

  private HttpServer receiver() throws IOException {
    HttpServer server =
        HttpServer.create(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0), 0);
    ObjectMapper json = new ObjectMapper();
    server.createContext(
        "/",
        exchange -> {
          JsonNode message = json.readTree(exchange.getRequestBody());
          message.path("alarms").forEach(alarm -> sent.add(alarm.path("n").asLong()));
          exchange.sendResponseHeaders(200, -1);
          exchange.close();
        });
    server.start();
    return server;
  }

  private void soak(int hours, int factor) throws Exception {
    HttpServer receiver = receiver();
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < VESSELS; i++) {
      text.append(vessel(i));
    }
    text.append("[notice]\nper-hour = 60\n[notice.webhook]\nurl = \"http://127.0.0.1:");
    text.append(receiver.getAddress().getPort()).append("/\"\n");
    Path cellar = folder.resolve("cellar.toml");
    Files.writeString(cellar, text);
    clock = new FastClock(BEGIN, factor);
    links = new BadLinks(this::bar, Math.max(10, 10_000 / factor));
    HeadlessPlan plan =
        new HeadlessPlan(
            cellar,
            folder.resolve("data"),
            Optional.of(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0)),
            Optional.empty());
    Use before;
    Use after;
    try (Headless headless =
        new Headless(plan, links, new Clocks(clock, clock::nanos), line -> {})) {
      headless.start();
      run(headless, 0, hours / 4.0, hours);
      before = Use.now();
      run(headless, hours / 4.0, hours, hours);
      links.unplugged.clear();
      after = Use.now();
      assertEquals(List.of(), headless.ailments());
    } finally {
      receiver.stop(0);
    }
    long alarms = check(hours);
    System.out.printf(
        "%d h at %d times the pace: %d alarm transitions, %d told; heap %+d KiB (%d to %d MiB),"
            + " threads %d to %d, descriptors %d to %d%n",
        hours,
        factor,
        alarms,
        sent.size(),
        (after.heap() - before.heap()) >> 10,
        before.heap() >> 20,
        after.heap() >> 20,
        before.threads(),
        after.threads(),
        before.descriptors(),
        after.descriptors());
    assertTrue(after.heap() - before.heap() < ALLOWED_GROWTH, before + " then " + after);
    assertTrue(after.threads() <= before.threads() + SPARE, before + " then " + after);
    assertTrue(after.descriptors() <= before.descriptors() + SPARE, before + " then " + after);
  }

  /** Swings across the alarm limits about every two and a half hours. */
  private double bar() {
    return 0.9 + 0.45 * Math.sin(clock.passed().toSeconds() / 1500.0);
  }

  private void run(Headless headless, double fromHour, double toHour, int hours) throws Exception {
    clock.goOn();
    double hour = fromHour;
    int turn = 0;
    long lastReload = (long) fromHour;
    while (hour < toHour) {
      hour = clock.passed().toSeconds() / 3600.0;
      double inHour = hour % 1;
      pull("/dev/line0", inHour > 0.33 && inHour < 0.5);
      pull("/dev/line1", inHour > 0.45 && inHour < 0.6);
      if (toHour == hours && hour > hours * 2 / 3.0 && clock.instant().isAfter(BEGIN)) {
        stepBackOnce();
      }
      if ((long) hour > lastReload) {
        lastReload = (long) hour;
        headless.reload();
      }
      if (++turn % SCRAPE_EVERY == 0) {
        for (String page : List.of("/", "/metrics", "/state", "/events?after=0")) {
          scrape(headless, page);
        }
      }
      TimeUnit.MILLISECONDS.sleep(25);
    }
    clock.hold();
  }

  private boolean stepped;

  private void stepBackOnce() {
    if (!stepped) {
      stepped = true;
      clock.step(Duration.ofHours(-1));
    }
  }

  private void pull(String port, boolean out) {
    if (out && links.unplugged.add(port)) {
      unplugged++;
    } else if (!out) {
      links.unplugged.remove(port);
    }
  }

  private static void scrape(Headless headless, String page) throws IOException {
    int port = headless.server().orElseThrow().address().getPort();
    try (var in = URI.create("http://127.0.0.1:" + port + page).toURL().openStream()) {
      in.transferTo(java.io.OutputStream.nullOutputStream());
    }
  }

  /** Looks through the journal; returns how many alarm transitions are in it. */
  private long check(int hours) throws IOException {
    List<JournalLines.Numbered> all =
        new JournalReader(new RealDisk(), folder.resolve("data/journal"))
            .find(n -> true, Integer.MAX_VALUE);
    Map<String, String> states = new HashMap<>();
    Set<Long> raised = new TreeSet<>();
    long alarms = 0;
    long silent = 0;
    boolean clockAlarm = false;
    for (int i = 0; i < all.size(); i++) {
      assertEquals(i + 1, all.get(i).number(), "a line of the journal is missing");
      JournalEntry entry = all.get(i).entry();
      if (!entry.kind().equals(JournalEntry.ALARM)) {
        continue;
      }
      alarms++;
      Map<String, Object> values = entry.values();
      String alarm = entry.vessel() + " " + values.get("alarm");
      String state = String.valueOf(values.get("state"));
      String previous = states.put(alarm, state);
      if (previous != null) {
        assertEquals(previous, values.get("from"), alarm + ": " + all.get(i));
      }
      String change = String.valueOf(values.get("change"));
      boolean raise = change.startsWith("raised") && state.equals(UNACKNOWLEDGED);
      silent += raise && values.get("alarm").equals("instrument-stale") ? 1 : 0;
      clockAlarm |= raise && alarm.equals(" clock");
      if (raise && !values.get("priority").equals("advice")) {
        raised.add(all.get(i).number());
      }
    }
    assertTrue(silent >= unplugged, silent + " silences raised of " + unplugged);
    assertTrue(unplugged >= hours - 1, "pulled only " + unplugged);
    assertTrue(clockAlarm, "the clock's step back raised no alarm");
    raised.removeAll(sent);
    raised.removeAll(waitingInTheOutbox());
    assertEquals(Set.of(), raised, "raised, but nobody was told");
    return alarms;
  }

  private Set<Long> waitingInTheOutbox() throws IOException {
    Set<Long> waiting = new TreeSet<>();
    try (Stream<Path> files = Files.list(folder.resolve("data/notices/webhook"))) {
      for (Path file : files.toList()) {
        JsonNode message = new ObjectMapper().readTree(Files.readString(file));
        message.path("alarms").forEach(alarm -> waiting.add(alarm.path("n").asLong()));
      }
    }
    return waiting;
  }
}

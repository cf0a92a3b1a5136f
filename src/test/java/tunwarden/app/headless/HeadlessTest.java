package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.app.Ran;
import tunwarden.units.BadInputException;

/** Unattended watching as a whole, in process, over ports that the test plays. */
class HeadlessTest {
  private static final String VESSEL =
      """
      [vessel.%s]
      volume = "2000 L"
      fill = "1800 L"
      liquid = { kind = "beer" }
      limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
      [vessel.%s.readings]
      pressure = { device = "text-line", port = "/dev/%s", field = "P" }
      temperature = { device = "text-line", port = "/dev/%s", field = "T" }
      """;

  @TempDir private Path folder;
  private final FakeLinks links = new FakeLinks(0.873, 50);
  private final List<String> console = new CopyOnWriteArrayList<>();
  private final HttpClient client = HttpClient.newHttpClient();
  private Path cellar;
  private Path told;
  private Headless headless;

  @BeforeEach
  void start() throws IOException {
    cellar = folder.resolve("cellar.toml");
    told = folder.resolve("told.json");
    Files.writeString(cellar, vessel("FV2") + "[recording]\nflush = \"1 s\"\n");
    headless = begin();
  }

  @AfterEach
  void stop() {
    headless.close();
  }

  private static String vessel(String id) {
    return VESSEL.formatted(id, id, id, id);
  }

  /** Word goes into a file by way of a program. */
  private String notice() {
    return "[notice]\ncommand = [\"tee\", \"" + told + "\"]\n";
  }

  private Headless begin() throws IOException {
    HeadlessPlan plan =
        new HeadlessPlan(
            cellar,
            folder.resolve("data"),
            Optional.of(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0)),
            Optional.empty());
    Headless begun = new Headless(plan, links, InstantSource.system(), console::add);
    begun.start();
    return begun;
  }

  private HttpResponse<String> get(String path) throws Exception {
    int port = headless.server().orElseThrow().address().getPort();
    URI uri = URI.create("http://127.0.0.1:" + port + path);
    return client.send(HttpRequest.newBuilder(uri).build(), HttpResponse.BodyHandlers.ofString());
  }

  private void await(String what, Callable<Boolean> condition) throws Exception {
    long end = System.nanoTime() + Duration.ofSeconds(20).toNanos();
    while (!condition.call()) {
      assertTrue(System.nanoTime() < end, () -> "waited in vain: " + what + " " + console);
      Thread.sleep(100);
    }
  }

  private boolean says(String path, String words) throws Exception {
    return get(path).body().contains(words);
  }

  @Test
  void whatAnInstrumentSaysIsServedAndRecordedAndSurvivesARestart() throws Exception {
    await("metrics", () -> says("/metrics", "tunwarden_pressure_bar_gauge{vessel=\"FV2\"} 0.873"));
    assertEquals(200, get("/health").statusCode());
    Files.writeString(cellar, Files.readString(cellar) + notice());
    headless.reload();
    await("the changed file", () -> says("/events", "read again"));
    links.unplugged.add("/dev/FV2");
    await("the alarm", () -> says("/events", "instrument silent raised"));
    assertTrue(says("/state", "\"instrument-stale\""));
    await("word of it", () -> Files.exists(told) && Files.readString(told).contains("FV2"));
    long begun = System.nanoTime();
    headless.close();
    long tookMs = (System.nanoTime() - begun) / 1_000_000;
    assertTrue(tookMs < 2000, "ending took " + tookMs + " ms");
    console.clear();
    headless = begin();
    assertTrue(
        console.stream().anyMatch(line -> line.startsWith("FV2: the estimate goes on from")),
        console::toString);
    assertTrue(says("/state", "\"instrument-stale\""), "the alarm is still there");
    assertTrue(says("/events?after=0", "Watching ended."));
  }

  private String alarms(int code, String... words) {
    List<String> args = new ArrayList<>(List.of("alarms"));
    args.addAll(List.of(words));
    args.addAll(List.of("--data", folder.resolve("data").toString()));
    Ran ran = Ran.tunwarden(args.toArray(String[]::new));
    assertEquals(code, ran.code(), ran::toString);
    return ran.out() + ran.err();
  }

  @Test
  void alarmsAreAcknowledgedShelvedAndNotedFromOutside() throws Exception {
    await("metrics", () -> says("/metrics", "gauge{vessel=\"FV2\"}"));
    links.unplugged.add("/dev/FV2");
    await("the alarm", () -> says("/events", "instrument silent raised"));
    String seen = alarms(0, "acknowledge", "--word", "on my way");
    assertEquals("acknowledged: FV2 instrument silent", seen.strip());
    assertTrue(says("/state", "\"acknowledged\""));
    assertTrue(alarms(1, "acknowledge").contains("no such alarm waits"));
    alarms(0, "shelve", "leak", "--vessel", "FV2", "--for", "2 h", "--word", "seal on order");
    alarms(0, "out-of-service", "vacuum", "--vessel", "FV2", "--word", "open for cleaning");
    alarms(0, "note", "new gauge fitted", "--vessel", "FV2");
    alarms(0, "note", "changed the router");
    String refused = alarms(1, "shelve", "leak", "--vessel", "FV2", "--for", "40 h", "--word", "x");
    assertTrue(refused.contains("at most 24 h"), refused);
    String unknown = alarms(1, "unshelve", "leak", "--vessel", "FV9");
    assertTrue(unknown.contains("there are FV2"), unknown);
    assertTrue(alarms(2, "unshelve", "leek", "--vessel", "FV2").contains("there are margin-low"));
    String list = alarms(0, "list");
    assertTrue(list.contains("FV2 leak: shelved"), list);
    assertTrue(list.contains("Said: on my way"), list);
    await("the notes", () -> says("/events", "new gauge fitted"));
    assertTrue(says("/events", "changed the router"));
    assertTrue(says("/events", "\"remark\":\"on my way\""));
    alarms(0, "unshelve", "leak", "--vessel", "FV2");
    alarms(0, "in-service", "vacuum", "--vessel", "FV2");
    assertFalse(alarms(0, "list").contains("shelved"));
  }

  @Test
  void aStalledLoopFailsTheHealthPageWhileThePagesStillAnswer() throws Exception {
    await("metrics", () -> says("/metrics", "gauge{vessel=\"FV2\"}"));
    assertEquals(200, get("/health").statusCode());
    CountDownLatch release = new CountDownLatch(1);
    headless
        .loop()
        .submit(
            () -> {
              try {
                release.await();
              } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
              }
            });
    await("the stall", () -> get("/health").statusCode() == 503);
    assertTrue(says("/health", "The watching loop has not come round for "));
    assertTrue(says("/", "has not come round"), "the status page says so too");
    assertEquals(200, get("/metrics").statusCode());
    release.countDown();
    await("health", () -> get("/health").statusCode() == 200);
  }

  @Test
  void anInstrumentOutOfServiceSuppressesWhatRestsOnIt() throws Exception {
    links.set(1.45);
    await("the alarm", () -> says("/events", "above earliest lift raised"));
    String out = "field = \"P\", out-of-service = \"being calibrated\" }";
    Files.writeString(cellar, Files.readString(cellar).replace("field = \"P\" }", out));
    headless.reload();
    await("suppression", () -> says("/events", "above earliest lift suppressed"));
    assertFalse(says("/state", "instrument-stale"), "nobody expects it to speak");
    Files.writeString(cellar, Files.readString(cellar).replace(out, "field = \"P\" }"));
    headless.reload();
    await("the alarm again", () -> says("/events", "above earliest lift no longer suppressed"));
  }

  @Test
  void aStartThatFailsSaysWhyAndLetsTheFolderGo() throws Exception {
    headless.close();
    String sound = Files.readString(cellar);
    Files.writeString(
        cellar,
        sound
            + "[notice.webhook]\nurl = \"https://hook.example/x\"\ntoken-file = \"no-such-file\"\n");
    String words = assertThrows(BadInputException.class, this::begin).getMessage();
    assertTrue(words.contains("no-such-file"), words);
    Files.writeString(cellar, sound);
    headless = begin();
    await("metrics", () -> says("/metrics", "gauge{vessel=\"FV2\"}"));
  }

  @Test
  void theFolderCannotBeUsedTwice() {
    String words = assertThrows(BadInputException.class, this::begin).getMessage();
    assertTrue(words.contains("in use by another"), words);
  }

  @Test
  void aChangedCellarFileIsTakenAndABadOneIsNot() throws Exception {
    await("metrics", () -> says("/metrics", "gauge{vessel=\"FV2\"}"));
    Files.writeString(cellar, vessel("FV2").replace("1800 L", "2800 L"));
    await("the refusal", () -> says("/state", "\"alarm\" : \"configuration\""));
    await("the word", () -> says("/events", "The cellar file was not taken: "));
    assertTrue(says("/metrics", "gauge{vessel=\"FV2\"}"), "the old one stays in use");
    Files.writeString(cellar, vessel("FV2") + vessel("BT1"));
    await("the new vessel", () -> says("/metrics", "gauge{vessel=\"BT1\"}"));
    await("the alarm to end", () -> says("/state", "returned-unacknowledged"));
    Files.writeString(cellar, vessel("BT1"));
    headless.reload();
    await("the old vessel to go", () -> !says("/metrics", "vessel=\"FV2\""));
  }
}

package tunwarden.notice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.sun.net.httpserver.HttpServer;
import com.sun.net.httpserver.HttpsConfigurator;
import com.sun.net.httpserver.HttpsServer;
import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CopyOnWriteArrayList;
import javax.net.ssl.SSLContext;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.Priority;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalLines;
import tunwarden.journal.JournalReader;
import tunwarden.journal.disk.RealDisk;
import tunwarden.units.BadInputException;

/** The command and the webhook, against real processes and a real HTTP server. */
class ChannelsTest {
  @TempDir private Path folder;
  private final List<String> bodies = new CopyOnWriteArrayList<>();
  private final List<String> tokens = new CopyOnWriteArrayList<>();
  private final List<Integer> answers = new CopyOnWriteArrayList<>();
  private HttpServer server;

  @BeforeEach
  void serve() throws IOException {
    server = HttpServer.create(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0), 0);
    server.createContext(
        "/",
        exchange -> {
          tokens.add(String.valueOf(exchange.getRequestHeaders().getFirst("Authorization")));
          byte[] body = exchange.getRequestBody().readAllBytes();
          bodies.add(new String(body, StandardCharsets.UTF_8));
          int answer = answers.isEmpty() ? 200 : answers.remove(0);
          exchange.sendResponseHeaders(answer, -1);
          exchange.close();
        });
    server.start();
  }

  @AfterEach
  void stop() {
    server.stop(0);
  }

  private URI uri() {
    return URI.create("http://127.0.0.1:" + server.getAddress().getPort() + "/alarm");
  }

  private static Message message() {
    return Message.of(List.of(Notices.silent("FV2", 7)), Notices.NOON);
  }

  @Test
  void aCommandGetsItsArgumentsAsTheyStandAndJsonOnItsInput() throws Exception {
    assumeTrue(Files.isExecutable(Path.of("/usr/bin/tee")), "skipped: no tee on this computer");
    Path odd = folder.resolve("a name; $(with) `shell` signs");
    new CommandChannel(List.of("tee", odd.toString())).send(message());
    var json = new ObjectMapper().readTree(Files.readString(odd));
    assertEquals("Tunwarden: FV2: instrument silent", json.path("subject").asText());
    assertEquals("instrument-stale", json.path("alarms").get(0).path("alarm").asText());
    assertEquals("FV2", json.path("alarms").get(0).path("vessel").asText());
  }

  @Test
  void aCommandThatFailsHangsOrIsMissingIsAFailureInWords() {
    assumeTrue(Files.isExecutable(Path.of("/bin/sleep")), "skipped: no sleep on this computer");
    String failed = failure(new CommandChannel(List.of("false")));
    assertEquals("false ended with code 1", failed);
    long begun = System.nanoTime();
    String hung = failure(new CommandChannel(List.of("sleep", "60"), Duration.ofMillis(300)));
    assertTrue(hung.contains("did not end"), hung);
    assertTrue(System.nanoTime() - begun < 20_000_000_000L);
    assertTrue(failure(new CommandChannel(List.of("no-such-program-here"))).contains("no-such"));
  }

  private static String failure(Channel channel) {
    return assertThrows(IOException.class, () -> channel.send(message())).getMessage();
  }

  @Test
  void aWebhookGetsTheMessageAndTheTokenIsNeverShown() throws Exception {
    Path file = folder.resolve("token");
    Files.writeString(file, "pears-and-plums\n");
    Optional<Secret> token = Secret.find(Optional.of(file), "UNUSED", Map.of());
    new WebhookChannel(uri(), token).send(message());
    assertEquals(List.of("Bearer pears-and-plums"), tokens);
    assertTrue(bodies.get(0).contains("\"subject\":\"Tunwarden: FV2: instrument silent\""));
    answers.add(500);
    String words = failure(new WebhookChannel(uri(), token));
    assertEquals("127.0.0.1 answered 500", words);
    assertFalse((token + words).contains("pears"));
  }

  @Test
  void redirectsAreNotFollowedAndAServerThatHangsIsGivenUp() throws Exception {
    answers.add(302);
    assertTrue(failure(new WebhookChannel(uri(), Optional.empty())).contains("302"));
    server.createContext(
        "/slow",
        exchange -> {
          try {
            Thread.sleep(5000);
          } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
          }
          exchange.close();
        });
    long begun = System.nanoTime();
    failure(
        new WebhookChannel(
            uri().resolve("/slow"), Optional.empty(), Duration.ofMillis(300), Optional.empty()));
    assertTrue(System.nanoTime() - begun < 4_000_000_000L);
  }

  @Test
  void aWebhookGoesOverHttpsToAServerThatProvesItsName() throws Exception {
    TestCertificate certificate = TestCertificate.make(folder.resolve("localhost.p12"));
    HttpsServer secure =
        HttpsServer.create(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0), 0);
    secure.setHttpsConfigurator(new HttpsConfigurator(certificate.serving()));
    secure.createContext(
        "/",
        exchange -> {
          bodies.add(new String(exchange.getRequestBody().readAllBytes(), StandardCharsets.UTF_8));
          exchange.sendResponseHeaders(204, -1);
          exchange.close();
        });
    secure.start();
    try {
      int port = secure.getAddress().getPort();
      URI named = URI.create("https://localhost:" + port + "/alarm");
      Optional<SSLContext> trust = Optional.of(certificate.trusting());
      Duration patience = Duration.ofSeconds(20);
      new WebhookChannel(named, Optional.empty(), patience, trust).send(message());
      assertEquals(1, bodies.size());
      assertTrue(bodies.get(0).contains("FV2: instrument silent"));
      failure(new WebhookChannel(named, Optional.empty()));
      URI otherName = URI.create("https://127.0.0.1:" + port + "/alarm");
      failure(new WebhookChannel(otherName, Optional.empty(), patience, trust));
      assertEquals(1, bodies.size(), "nothing is sent to a server that cannot prove its name");
    } finally {
      secure.stop(0);
    }
  }

  @Test
  void plainHttpGoesToThisComputerOnly() {
    URI away = URI.create("http://198.51.100.7/alarm");
    assertThrows(BadInputException.class, () -> new WebhookChannel(away, Optional.empty()));
  }

  @Test
  void aSecretComesFromAFileOrTheEnvironment() throws IOException {
    var environment = Map.of("TUNWARDEN_X", "from-there");
    assertEquals(
        "from-there",
        Secret.find(Optional.empty(), "TUNWARDEN_X", environment).orElseThrow().reveal());
    assertTrue(Secret.find(Optional.empty(), "OTHER", environment).isEmpty());
    Path empty = folder.resolve("empty");
    Files.writeString(empty, "\n");
    assertThrows(BadInputException.class, () -> Secret.find(Optional.of(empty), "X", environment));
    Path absent = folder.resolve("absent");
    assertThrows(BadInputException.class, () -> Secret.find(Optional.of(absent), "X", environment));
  }

  private Notifier notifier(List<String> troubles) throws IOException {
    return new Notifier(
        List.of(new WebhookChannel(uri(), Optional.empty())),
        new RealDisk(),
        folder.resolve("outbox"),
        () -> Notices.NOON,
        (failing, text) -> troubles.add(failing + " " + text),
        new NoticeRules(Priority.CAUTION, Duration.ZERO, 100),
        new Courier.Pace(Duration.ofMillis(20), Duration.ofMillis(100)));
  }

  @Test
  void whatIsRefusedIsTriedAgainAndTroubleIsToldOnceAndEnded() throws Exception {
    List<String> troubles = new CopyOnWriteArrayList<>();
    answers.addAll(List.of(500, 500, 500, 500));
    try (Notifier notifier = notifier(troubles)) {
      notifier.start();
      notifier.recorded(List.of(Notices.silent("FV2", 1)), true);
      Notices.await("delivery", () -> troubles.size() == 2);
    }
    assertEquals(5, bodies.size());
    assertTrue(troubles.get(0).startsWith("true Word does not get through: 127.0.0.1 answered"));
    assertTrue(troubles.get(1).startsWith("false"));
  }

  @Test
  void whatWasNotDeliveredGoesOutAfterARestart() throws Exception {
    for (int i = 0; i < 1000; i++) {
      answers.add(503);
    }
    try (Notifier notifier = notifier(new CopyOnWriteArrayList<>())) {
      notifier.start();
      notifier.recorded(List.of(Notices.silent("FV2", 1)), true);
      Notices.await("an attempt", () -> !bodies.isEmpty());
      notifier.recorded(List.of(Notices.silent("FV3", 2)), true);
    }
    answers.clear();
    bodies.clear();
    try (Notifier notifier = notifier(new CopyOnWriteArrayList<>())) {
      notifier.start();
      Notices.await("both", () -> bodies.size() == 2);
    }
    assertTrue(bodies.get(0).contains("FV2") && bodies.get(1).contains("FV3"));
  }

  @Test
  void whatWasInTheJournalOnlyWhenTheProgramDiedIsToldAtTheNextStart() throws Exception {
    try (Notifier notifier = notifier(new CopyOnWriteArrayList<>())) {
      notifier.start();
      notifier.recorded(List.of(Notices.silent("FV1", 1)), true);
      Notices.await("the first", () -> bodies.size() == 1);
    }
    // The second waits for others, and is in nothing but memory and the journal at a kill.
    Path journal = Files.createDirectories(folder.resolve("journal")).resolve("2026-03.jsonl");
    StringBuilder lines = new StringBuilder();
    for (int n = 1; n <= 2; n++) {
      JournalLines.Numbered silent = Notices.silent("FV" + n, n);
      JournalEntry entry =
          new JournalEntry(
              Notices.NOON,
              silent.entry().vessel(),
              silent.entry().kind(),
              silent.entry().text(),
              silent.entry().values());
      lines.append(JournalLines.line(new JournalLines.Numbered(n, entry))).append('\n');
    }
    Files.writeString(journal, lines);
    bodies.clear();
    for (int start = 0; start < 2; start++) {
      try (Notifier notifier = notifier(new CopyOnWriteArrayList<>())) {
        notifier.catchUp(new JournalReader(new RealDisk(), journal.getParent()));
        notifier.start();
        Notices.await("the second", () -> bodies.size() == 1);
        Thread.sleep(start * 500L);
      }
    }
    assertEquals(1, bodies.size(), "told once");
    assertTrue(bodies.get(0).contains("FV2") && !bodies.get(0).contains("FV1"), bodies::toString);
  }
}

package tunwarden.journal.request;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.concurrent.CompletableFuture;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.alarm.AlarmKind;
import tunwarden.journal.disk.RealDisk;

/** Requests left in the folder, good and hostile. */
class RequestBoxTest {
  private static final Instant NOW = Instant.parse("2026-03-02T12:00:00Z");

  @TempDir private Path folder;
  private RequestBox box;
  private final List<Request> taken = new ArrayList<>();

  @BeforeEach
  void open() throws IOException {
    box = new RequestBox(new RealDisk(), Files.createDirectories(folder.resolve("requests")));
  }

  private Reply take(Request request) {
    taken.add(request);
    return Reply.done("so be it");
  }

  private Path put(String content) throws IOException {
    Path file = folder.resolve("requests").resolve(UUID.randomUUID() + ".json");
    Files.writeString(file, content);
    return file;
  }

  private String served(Path file) throws IOException {
    box.serve(NOW, this::take);
    assertFalse(Files.exists(file), "a request is taken away whatever it was");
    return Files.readString(Path.of(file.toString().replace(".json", ".answer"))).strip();
  }

  @Test
  void whatIsAskedIsDoneAndAnswered() throws Exception {
    Request request =
        new Request(
            Request.Deed.SHELVE,
            "FV2",
            Optional.of(AlarmKind.LEAK),
            "seal \u001b[31mon order",
            Optional.of(Duration.ofHours(2)),
            NOW);
    CompletableFuture<Optional<Reply>> asked =
        CompletableFuture.supplyAsync(
            () -> {
              try {
                return box.ask(request, Duration.ofSeconds(20));
              } catch (IOException e) {
                throw new java.io.UncheckedIOException(e);
              }
            });
    while (!asked.isDone()) {
      box.serve(NOW, this::take);
      Thread.sleep(10);
    }
    assertEquals(Optional.of(Reply.done("so be it")), asked.get());
    assertEquals(List.of(request), taken);
    assertEquals("seal  [31mon order", taken.get(0).word());
    try (var left = Files.list(folder.resolve("requests"))) {
      assertEquals(0, left.count());
    }
  }

  @Test
  void aRequestThatNobodyTakesIsTakenBack() throws IOException {
    Request note =
        new Request(Request.Deed.NOTE, "", Optional.empty(), "hello", Optional.empty(), NOW);
    assertTrue(box.ask(note, Duration.ofMillis(120)).isEmpty());
    box.serve(NOW, this::take);
    assertEquals(List.of(), taken);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "{",
        "[1]",
        "{\"deed\":\"erase\"}",
        "{\"deed\":\"note\",\"asked\":\"soon\"}",
        "{\"deed\":\"shelve\",\"alarm\":\"../../etc\",\"asked\":\"2026-03-02T12:00:00Z\"}",
        "{\"deed\":\"note\",\"word\":\"old\",\"asked\":\"2026-03-02T11:00:00Z\"}"
      })
  void whatIsNoRequestIsRefused(String content) throws IOException {
    String answer = served(put(content));
    assertTrue(answer.startsWith("refused "), answer);
    assertEquals(List.of(), taken);
  }

  @Test
  void deepAndHugeRequestsAreRefused() throws IOException {
    assertTrue(served(put("{\"a\":".repeat(1000) + "1" + "}".repeat(1000))).startsWith("refused"));
    assertTrue(served(put("[".repeat(100_000))).startsWith("refused"));
    assertEquals(List.of(), taken);
  }

  @Test
  void linksAndOtherFilesAreNotLookedInto() throws IOException {
    Path secret = folder.resolve("secret");
    Files.writeString(
        secret, "{\"deed\":\"note\",\"word\":\"x\",\"asked\":\"2026-03-02T12:00:00Z\"}");
    Path link = folder.resolve("requests").resolve(UUID.randomUUID() + ".json");
    Files.createSymbolicLink(link, secret);
    Files.writeString(folder.resolve("requests/notes.txt"), "mine");
    assertEquals("refused this is no request", served(link));
    assertTrue(Files.exists(secret));
    assertTrue(Files.exists(folder.resolve("requests/notes.txt")));
  }
}

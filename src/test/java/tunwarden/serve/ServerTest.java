package tunwarden.serve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.OutputStream;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import tunwarden.units.BadInputException;

/** The pages, and what is refused. */
class ServerTest {
  private final ServeFixture fixture = new ServeFixture();
  private Server server;

  @BeforeEach
  void start() throws IOException {
    server = fixture.server(Optional.empty());
  }

  @AfterEach
  void stop() {
    server.close();
  }

  @Test
  void stateIsJsonWithUnitsInItsKeys() throws Exception {
    JsonNode state = new ObjectMapper().readTree(fixture.get(server, "/state").body());
    JsonNode fv2 = state.path("vessels").get(1);
    assertEquals("FV2", fv2.path("vessel").asText());
    assertEquals(1.31, fv2.path("pressure_bar_g").asDouble(), 1e-12);
    assertEquals(4.0, fv2.path("temperature_c").asDouble(), 1e-9);
    assertEquals(0.08, fv2.path("relief_margin_bar").asDouble(), 1e-9);
    assertEquals("margin-low", fv2.path("alarms").get(0).path("alarm").asText());
    assertEquals("good", fv2.path("pressure_quality").asText());
    JsonNode supply = fv2.path("what_if").get(0);
    assertEquals("supply", supply.path("kind").asText());
    assertEquals(8, supply.path("bar_g").asDouble());
    assertEquals(14, supply.path("time_to_lift").path("middle_s").asLong());
    assertEquals(1, supply.path("cautions").size());
    assertEquals("bad", state.path("vessels").get(2).path("pressure_quality").asText());
  }

  @Test
  void healthIs503WithTheReasons() throws Exception {
    assertEquals(200, fixture.get(server, "/health").statusCode());
    fixture.ailments.add("the loop has not come round for 12 s");
    var ill = fixture.get(server, "/health");
    assertEquals(503, ill.statusCode());
    assertTrue(ill.body().contains("has not come round for 12 s"));
  }

  @Test
  void eventsFollowANumberOrATime() throws Exception {
    assertEquals(5, fixture.get(server, "/events").body().lines().count());
    assertEquals(2, fixture.get(server, "/events?after=3").body().lines().count());
    String time = ServeFixture.NOW.plusSeconds(4).toString();
    assertEquals(1, fixture.get(server, "/events?after=" + time).body().lines().count());
    assertEquals(400, fixture.get(server, "/events?after=yesterday").statusCode());
  }

  @Test
  void theStatusPageEscapesWhatPeopleWrote() throws Exception {
    String page = fixture.get(server, "/").body();
    assertTrue(page.contains("pale &lt;b&gt;ale&lt;/b&gt; &amp; &quot;more&quot;"));
    assertFalse(page.contains("<b>ale"));
    assertFalse(page.contains("<script"));
    assertTrue(page.contains("earliest lift"));
    assertTrue(page.indexOf("FV2") < page.indexOf("BT1"), "the closest to relief comes first");
  }

  @Test
  void thereIsNothingElse() throws Exception {
    assertEquals(404, fixture.get(server, "/../../etc/passwd").statusCode());
    assertEquals(404, fixture.get(server, "/state/FV2").statusCode());
    assertTrue(raw("POST /state HTTP/1.1\r\nHost: localhost\r\n\r\n").contains(" 405 "));
    assertTrue(raw("GET / HTTP/1.1\r\nHost: evil.example\r\n\r\n").contains(" 403 "));
    String body = "GET / HTTP/1.1\r\nHost: localhost\r\nContent-Length: 5\r\n\r\nhello";
    assertTrue(raw(body).contains(" 413 "));
    String longUri = "GET /" + "a".repeat(3000) + " HTTP/1.1\r\nHost: localhost\r\n\r\n";
    assertTrue(raw(longUri).contains(" 414 "));
    assertEquals(200, fixture.get(server, "/health").statusCode());
  }

  @Test
  void tooManyRequestsAreTurnedAwayUntilTimeHasPassed() {
    AtomicLong nanos = new AtomicLong();
    Gate.RateLimit limit = new Gate.RateLimit(20, 60, nanos::get);
    assertEquals(60, IntStream.range(0, 100).filter(i -> limit.allows()).count());
    nanos.addAndGet(500_000_000L);
    assertEquals(10, IntStream.range(0, 100).filter(i -> limit.allows()).count());
    nanos.addAndGet(3_600_000_000_000L);
    assertEquals(60, IntStream.range(0, 100).filter(i -> limit.allows()).count());
  }

  @Test
  void aSilentClientDoesNotKeepOthersOut() throws Exception {
    try (Socket one = new Socket(InetAddress.getLoopbackAddress(), server.address().getPort());
        Socket two = new Socket(InetAddress.getLoopbackAddress(), server.address().getPort());
        Socket three = new Socket(InetAddress.getLoopbackAddress(), server.address().getPort())) {
      for (Socket silent : new Socket[] {one, two, three}) {
        silent.getOutputStream().write("GET / HT".getBytes(StandardCharsets.US_ASCII));
        silent.getOutputStream().flush();
      }
      long begun = System.nanoTime();
      assertEquals(200, fixture.get(server, "/health").statusCode());
      assertTrue(System.nanoTime() - begun < 4_000_000_000L, "answered before they are cut off");
    }
  }

  @Test
  void aTokenIsAskedForAsBearerOrPassword() throws Exception {
    server.close();
    server = fixture.server(Optional.of("s3cret"));
    assertEquals(401, fixture.get(server, "/state").statusCode());
    assertEquals(401, fixture.get(server, "/state", "Authorization", "Bearer s3cre").statusCode());
    assertEquals(200, fixture.get(server, "/state", "Authorization", "Bearer s3cret").statusCode());
    String pair = Base64.getEncoder().encodeToString("me:s3cret".getBytes(StandardCharsets.UTF_8));
    assertEquals(200, fixture.get(server, "/", "Authorization", "Basic " + pair).statusCode());
  }

  @Test
  void otherAddressesNeedATokenAndATakenPortIsExplained() {
    var everywhere = ServeAddress.parse("0.0.0.0:0");
    String words =
        assertThrows(
                BadInputException.class,
                () -> new Server(everywhere, Optional.empty(), fixture.served()))
            .getMessage();
    assertTrue(words.contains("--token-file"), words);
    var taken = new InetSocketAddress(InetAddress.getLoopbackAddress(), server.address().getPort());
    assertThrows(
        BadInputException.class, () -> new Server(taken, Optional.empty(), fixture.served()));
    for (String bad : new String[] {"9470", ":9470", "localhost", "localhost:x", "h:70000"}) {
      assertThrows(BadInputException.class, () -> ServeAddress.parse(bad), bad);
    }
  }

  private String raw(String request) throws IOException {
    try (Socket socket = new Socket(InetAddress.getLoopbackAddress(), server.address().getPort())) {
      socket.setSoTimeout(10_000);
      OutputStream out = socket.getOutputStream();
      out.write(request.getBytes(StandardCharsets.US_ASCII));
      out.flush();
      byte[] answer = socket.getInputStream().readNBytes(40);
      return new String(answer, StandardCharsets.US_ASCII);
    }
  }
}

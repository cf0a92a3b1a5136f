package tunwarden.serve;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.List;
import tunwarden.journal.JournalLines;
import tunwarden.serve.Server.Answer;

/** Which page answers which path. */
final class Pages {
  private static final String JSON = "application/json; charset=utf-8";

  private final Served served;
  private final MetricsPage metrics = new MetricsPage();

  Pages(Served served) {
    this.served = served;
  }

  Answer answer(URI uri) throws IOException {
    return switch (uri.getPath()) {
      case "/" -> text(200, "text/html; charset=utf-8", StatusPage.of(served));
      case "/metrics" -> new Answer(200, MetricsPage.CONTENT_TYPE, metrics.write(served));
      case "/state" -> text(200, JSON, StateJson.of(served).toPrettyString() + "\n");
      case "/health" -> health();
      case "/events" -> events(uri.getQuery());
      default ->
          Answer.plain(404, "There are /, /metrics, /state, /health and /events?after=N here.");
    };
  }

  private static Answer text(int status, String type, String body) {
    return new Answer(status, type, body.getBytes(StandardCharsets.UTF_8));
  }

  private Answer health() {
    List<String> ailments = served.ailments().get();
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("ok", ailments.isEmpty());
    ArrayNode reasons = node.putArray("reasons");
    ailments.forEach(reasons::add);
    return text(ailments.isEmpty() ? 200 : 503, JSON, node.toPrettyString() + "\n");
  }

  private Answer events(String query) throws IOException {
    List<JournalLines.Numbered> found;
    if (query == null || query.isEmpty() || query.equals("after=")) {
      found = served.events().newest();
    } else if (query.matches("after=\\d{1,18}")) {
      found = served.events().after(Long.parseLong(query.substring("after=".length())));
    } else {
      try {
        found = served.events().after(Instant.parse(query.replaceFirst("^after=", "")));
      } catch (DateTimeException notATime) {
        return Answer.plain(
            400, "Write after= and a number or a time such as 2026-03-02T06:00:00Z.");
      }
    }
    StringBuilder lines = new StringBuilder();
    found.forEach(entry -> lines.append(JournalLines.line(entry)).append('\n'));
    return text(200, "application/x-ndjson; charset=utf-8", lines.toString());
  }
}

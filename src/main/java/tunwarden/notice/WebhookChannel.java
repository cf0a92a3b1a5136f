package tunwarden.notice;

import java.io.IOException;
import java.io.InputStream;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.util.Optional;
import java.util.Set;
import javax.net.ssl.SSLContext;
import tunwarden.units.BadInputException;

/** Posts the message as JSON over HTTPS; over plain HTTP only to this computer. */
public final class WebhookChannel implements Channel {
  private static final Duration CONNECT = Duration.ofSeconds(10);
  private static final Duration ANSWER = Duration.ofSeconds(20);
  private static final Set<String> HERE = Set.of("localhost", "127.0.0.1", "[::1]");

  private final URI uri;
  private final Optional<Secret> token;
  private final Duration answer;
  private final HttpClient client;

  /**
   * A webhook.
   *
   * @param token sent as a bearer token, if given
   * @throws BadInputException when the address is neither HTTPS nor of this computer
   */
  public WebhookChannel(URI uri, Optional<Secret> token) {
    this(uri, token, ANSWER, Optional.empty());
  }

  /** With other certificates trusted than those of the system, if given. */
  WebhookChannel(URI uri, Optional<Secret> token, Duration answer, Optional<SSLContext> trust) {
    boolean fit =
        "https".equals(uri.getScheme())
            || "http".equals(uri.getScheme()) && HERE.contains(uri.getHost());
    if (!fit || uri.getHost() == null) {
      throw new BadInputException(
          "The webhook " + uri + " must be an https address, or http on this computer.");
    }
    this.uri = uri;
    this.token = token;
    this.answer = answer;
    HttpClient.Builder builder =
        HttpClient.newBuilder().connectTimeout(CONNECT).followRedirects(HttpClient.Redirect.NEVER);
    trust.ifPresent(builder::sslContext);
    this.client = builder.build();
  }

  @Override
  public String name() {
    return "webhook";
  }

  @Override
  public void send(Message message) throws IOException {
    HttpRequest.Builder request =
        HttpRequest.newBuilder(uri)
            .timeout(answer)
            .header("Content-Type", "application/json; charset=utf-8")
            .POST(HttpRequest.BodyPublishers.ofString(message.json().toString()));
    token.ifPresent(secret -> request.header("Authorization", "Bearer " + secret.reveal()));
    try {
      // The body is of no interest and may be endless: only the status is awaited.
      HttpResponse<InputStream> response =
          client.send(request.build(), HttpResponse.BodyHandlers.ofInputStream());
      response.body().close();
      if (response.statusCode() / 100 != 2) {
        throw new IOException(uri.getHost() + " answered " + response.statusCode());
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IOException("posting was interrupted", e);
    }
  }
}

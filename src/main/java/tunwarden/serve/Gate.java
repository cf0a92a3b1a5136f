package tunwarden.serve;

import com.sun.net.httpserver.HttpExchange;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.Base64;
import java.util.Optional;
import java.util.Set;
import java.util.function.LongSupplier;

/** Lets a request through or says with which status and sentence it is refused. */
final class Gate {
  private static final int LONGEST_URI = 2000;
  private static final Set<String> OWN_NAMES = Set.of("localhost", "127.0.0.1", "[::1]");

  private final Optional<String> token;
  private final RateLimit rate;

  /** A refusal. */
  record Refusal(int status, String text) {}

  Gate(Optional<String> token, RateLimit rate) {
    this.token = token;
    this.rate = rate;
  }

  Optional<Refusal> refusal(HttpExchange exchange) {
    if (!rate.allows()) {
      return refuse(429, "Too many requests; ask less often.");
    }
    if (!Set.of("GET", "HEAD").contains(exchange.getRequestMethod())) {
      return refuse(405, "Only GET and HEAD are answered.");
    }
    if (exchange.getRequestURI().toString().length() > LONGEST_URI) {
      return refuse(414, "The address is too long.");
    }
    String length = exchange.getRequestHeaders().getFirst("Content-Length");
    if (exchange.getRequestHeaders().containsKey("Transfer-Encoding")
        || (length != null && !length.equals("0"))) {
      return refuse(413, "A request has no body here.");
    }
    if (token.isEmpty() && !isOwnName(exchange)) {
      return refuse(403, "Ask by the name localhost.");
    }
    return token.isPresent() && !knows(exchange, token.get())
        ? refuse(401, "The token is needed.")
        : Optional.empty();
  }

  private static Optional<Refusal> refuse(int status, String text) {
    return Optional.of(new Refusal(status, text));
  }

  /** A web page elsewhere must not reach us through a name that it points at this computer. */
  private static boolean isOwnName(HttpExchange exchange) {
    String host = exchange.getRequestHeaders().getFirst("Host");
    return host != null && OWN_NAMES.contains(host.replaceFirst(":\\d+$", ""));
  }

  /** The token as a bearer token, or as the password of a browser's log-in. */
  private static boolean knows(HttpExchange exchange, String token) {
    String header = exchange.getRequestHeaders().getFirst("Authorization");
    String given = "";
    if (header != null && header.startsWith("Bearer ")) {
      given = header.substring("Bearer ".length()).strip();
    } else if (header != null && header.startsWith("Basic ")) {
      given = password(header.substring("Basic ".length()).strip());
    }
    return MessageDigest.isEqual(
        given.getBytes(StandardCharsets.UTF_8), token.getBytes(StandardCharsets.UTF_8));
  }

  private static String password(String encoded) {
    try {
      String pair = new String(Base64.getDecoder().decode(encoded), StandardCharsets.UTF_8);
      return pair.substring(pair.indexOf(':') + 1);
    } catch (IllegalArgumentException notBase64) {
      return "";
    }
  }

  /** So many requests a second on average, with a reserve for bursts. */
  static final class RateLimit {
    private final double perSecond;
    private final double reserve;
    private final LongSupplier nanos;
    private double left;
    private long last;

    RateLimit(double perSecond, double reserve, LongSupplier nanos) {
      this.perSecond = perSecond;
      this.reserve = reserve;
      this.nanos = nanos;
      this.left = reserve;
      this.last = nanos.getAsLong();
    }

    synchronized boolean allows() {
      long now = nanos.getAsLong();
      left = Math.min(reserve, left + (now - last) * 1e-9 * perSecond);
      last = now;
      if (left < 1) {
        return false;
      }
      left--;
      return true;
    }
  }
}

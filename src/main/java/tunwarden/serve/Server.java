package tunwarden.serve;

import com.sun.net.httpserver.HttpExchange;
import com.sun.net.httpserver.HttpServer;
import java.io.Closeable;
import java.io.IOException;
import java.net.BindException;
import java.net.InetSocketAddress;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.units.BadInputException;

/**
 * The HTTP server: a few threads and a short queue, so that no number of requests can take the
 * computer from the loop, and nothing that a request does waits for the loop. A client that sends
 * nothing holds a thread for five seconds at most.
 */
public final class Server implements Closeable {
  private static final Logger LOG = LoggerFactory.getLogger(Server.class);
  private static final double REQUESTS_PER_S = 20;
  private static final double BURST = 60;
  private static final int THREADS = 8;
  private static final int QUEUE = 32;

  private final HttpServer http;
  private final ThreadPoolExecutor threads;
  private final Gate gate;
  private final Pages pages;

  /**
   * Binds the address and answers from now on.
   *
   * @param token needed unless the address is the loopback
   * @throws BadInputException when the address is taken, or open to others without a token
   */
  public Server(InetSocketAddress address, Optional<String> token, Served served)
      throws IOException {
    check(address, token);
    limit("sun.net.httpserver.maxReqTime", "5");
    limit("sun.net.httpserver.maxRspTime", "30");
    limit("sun.net.httpserver.maxReqHeaders", "60");
    limit("jdk.httpserver.maxConnections", "64");
    try {
      http = HttpServer.create(address, 16);
    } catch (BindException taken) {
      throw new BadInputException(
          "Cannot serve on "
              + address.getAddress().getHostAddress()
              + ":"
              + address.getPort()
              + ": the address is in use or not of this computer; give another with --serve.",
          taken);
    }
    gate = new Gate(token, new Gate.RateLimit(REQUESTS_PER_S, BURST, System::nanoTime));
    pages = new Pages(served);
    threads =
        new ThreadPoolExecutor(
            THREADS,
            THREADS,
            0,
            TimeUnit.SECONDS,
            new LinkedBlockingQueue<>(QUEUE),
            Server::thread);
    http.setExecutor(threads);
    http.createContext("/", this::answer);
    http.start();
  }

  /**
   * Whether an address may be served on at all.
   *
   * @throws BadInputException when it is open to others without a token
   */
  public static void check(InetSocketAddress address, Optional<String> token) {
    if (!address.getAddress().isLoopbackAddress() && token.isEmpty()) {
      throw new BadInputException(
          address.getAddress().getHostAddress()
              + " can be reached from other computers; give --token-file, or serve on "
              + ServeAddress.USUAL);
    }
  }

  private static void limit(String property, String value) {
    if (System.getProperty(property) == null) {
      System.setProperty(property, value);
    }
  }

  private static Thread thread(Runnable task) {
    Thread thread = new Thread(task, "serve");
    thread.setDaemon(true);
    return thread;
  }

  /** Where it listens; of use when port 0 was asked for. */
  public InetSocketAddress address() {
    return http.getAddress();
  }

  private void answer(HttpExchange exchange) throws IOException {
    try (exchange) {
      Optional<Gate.Refusal> refusal = gate.refusal(exchange);
      if (refusal.isPresent()) {
        if (refusal.get().status() == 401) {
          exchange.getResponseHeaders().set("WWW-Authenticate", "Basic realm=\"tunwarden\"");
        }
        send(exchange, Answer.plain(refusal.get().status(), refusal.get().text()));
        return;
      }
      send(exchange, pages.answer(exchange.getRequestURI()));
    } catch (RuntimeException e) {
      LOG.warn("a page could not be made", e);
      throw e;
    }
  }

  /** What goes back. */
  record Answer(int status, String type, byte[] body) {
    static Answer plain(int status, String text) {
      return new Answer(
          status, "text/plain; charset=utf-8", (text + "\n").getBytes(StandardCharsets.UTF_8));
    }
  }

  private static void send(HttpExchange exchange, Answer answer) throws IOException {
    var headers = exchange.getResponseHeaders();
    headers.set("Content-Type", answer.type());
    headers.set("Cache-Control", "no-store");
    headers.set("X-Content-Type-Options", "nosniff");
    headers.set(
        "Content-Security-Policy",
        "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'");
    if (exchange.getRequestMethod().equals("HEAD")) {
      headers.set("Content-Length", String.valueOf(answer.body().length));
      exchange.sendResponseHeaders(answer.status(), -1);
      return;
    }
    exchange.sendResponseHeaders(answer.status(), answer.body().length);
    exchange.getResponseBody().write(answer.body());
  }

  @Override
  public void close() {
    http.stop(0);
    threads.shutdownNow();
  }
}

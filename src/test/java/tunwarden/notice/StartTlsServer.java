package tunwarden.notice;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import javax.net.ssl.SSLContext;
import javax.net.ssl.SSLSocket;

/**
 * The smallest mail server that speaks STARTTLS (RFC 3207): one connection, everything it hears
 * kept, what came before the encryption apart from what came after.
 */
final class StartTlsServer implements AutoCloseable {
  final List<String> plain = new CopyOnWriteArrayList<>();
  final List<String> encrypted = new CopyOnWriteArrayList<>();
  private final ServerSocket listening;
  private final SSLContext keys;

  StartTlsServer(SSLContext keys) throws IOException {
    this.keys = keys;
    this.listening = new ServerSocket(0, 1, InetAddress.getByName("localhost"));
    Thread thread = new Thread(this::serve, "starttls");
    thread.setDaemon(true);
    thread.start();
  }

  int port() {
    return listening.getLocalPort();
  }

  private void serve() {
    try (Socket socket = listening.accept()) {
      say(socket, "220 test");
      if (talk(socket, plain, "250-test\r\n250 STARTTLS")) {
        SSLSocket secure =
            (SSLSocket)
                keys.getSocketFactory().createSocket(socket, "localhost", socket.getPort(), true);
        secure.setUseClientMode(false);
        talk(secure, encrypted, "250-test\r\n250 AUTH PLAIN LOGIN");
      }
    } catch (IOException ended) {
      encrypted.add("ended: " + ended);
    }
  }

  /** Answers until STARTTLS or the end; true for STARTTLS. */
  private static boolean talk(Socket socket, List<String> heard, String greeting)
      throws IOException {
    BufferedReader in =
        new BufferedReader(new InputStreamReader(socket.getInputStream(), StandardCharsets.UTF_8));
    boolean body = false;
    for (String line = in.readLine(); line != null; line = in.readLine()) {
      heard.add(line);
      if (body) {
        body = !line.equals(".");
        if (!body) {
          say(socket, "250 taken");
        }
        continue;
      }
      String word = line.split(" ")[0];
      switch (word) {
        case "EHLO" -> say(socket, greeting);
        case "STARTTLS" -> {
          say(socket, "220 go on");
          return true;
        }
        case "AUTH" -> say(socket, line.contains(" ") ? "235 known" : "334 ");
        case "DATA" -> {
          say(socket, "354 say it");
          body = true;
        }
        case "QUIT" -> {
          say(socket, "221 farewell");
          return false;
        }
        default -> say(socket, "250 yes");
      }
    }
    return false;
  }

  private static void say(Socket socket, String line) throws IOException {
    OutputStream out = socket.getOutputStream();
    out.write((line + "\r\n").getBytes(StandardCharsets.US_ASCII));
    out.flush();
  }

  @Override
  public void close() throws IOException {
    listening.close();
  }
}

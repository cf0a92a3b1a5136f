package tunwarden.notice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.icegreen.greenmail.util.GreenMail;
import com.icegreen.greenmail.util.GreenMailUtil;
import com.icegreen.greenmail.util.ServerSetup;
import jakarta.mail.internet.MimeMessage;
import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javax.net.ssl.SSLContext;
import javax.net.ssl.SSLSocketFactory;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** E-mail against a real SMTP server over TLS, with a certificate made for the test. */
class MailChannelTest {
  private static final String USER = "cellar";
  private static final String PASSWORD = "figs-and-quinces";

  @TempDir private static Path folder;
  private static GreenMail mail;
  private static SSLSocketFactory trusting;
  private static SSLContext serving;

  @BeforeAll
  static void start() throws Exception {
    Path store = folder.resolve("localhost.p12");
    TestCertificate certificate = TestCertificate.make(store);
    System.setProperty("greenmail.tls.keystore.file", store.toString());
    System.setProperty("greenmail.tls.keystore.password", TestCertificate.PASSWORD);
    mail =
        new GreenMail(
            new ServerSetup[] {
              setup(ServerSetup.PROTOCOL_SMTPS), setup(ServerSetup.PROTOCOL_SMTP)
            });
    mail.setUser("cellar@brine.example", USER, PASSWORD);
    mail.start();
    trusting = certificate.trusting().getSocketFactory();
    serving = certificate.serving();
  }

  private static ServerSetup setup(String protocol) {
    ServerSetup setup = new ServerSetup(0, "localhost", protocol);
    setup.setServerStartupTimeout(30_000);
    return setup;
  }

  @AfterAll
  static void stop() {
    mail.stop();
    System.clearProperty("greenmail.tls.keystore.file");
    System.clearProperty("greenmail.tls.keystore.password");
  }

  private static MailChannel.Account account(String host, boolean tls, String password) {
    int port = tls ? mail.getSmtps().getPort() : mail.getSmtp().getPort();
    return new MailChannel.Account(
        host,
        port,
        tls,
        "cellar@brine.example",
        List.of("keeper@brine.example"),
        Optional.of(USER),
        Optional.of(Secret.of(password)));
  }

  private static String failure(MailChannel channel) {
    return assertThrows(IOException.class, () -> channel.send(Message.test(Notices.NOON)))
        .getMessage();
  }

  @Test
  void aMessageArrivesOverTlsAfterLoggingIn() throws Exception {
    Message message = Message.of(List.of(Notices.silent("FV2", 7)), Notices.NOON);
    Message odd =
        new Message(
            message.made(), "two\r\nBcc: thief@brine.example", message.text(), message.alarms());
    new MailChannel(account("localhost", true, PASSWORD), Optional.of(trusting)).send(odd);
    assertTrue(mail.waitForIncomingEmail(10_000, 1));
    MimeMessage[] arrived = mail.getReceivedMessages();
    assertEquals(1, arrived.length, "one receiver, nothing slipped into the headers");
    assertEquals("two  Bcc: thief@brine.example", arrived[0].getSubject());
    assertTrue(GreenMailUtil.getBody(arrived[0]).contains("FV2: instrument silent raised"));
    assertEquals("auto-generated", arrived[0].getHeader("Auto-Submitted")[0]);
  }

  @Test
  void aWrongPasswordIsAFailureThatDoesNotShowIt() {
    String words =
        failure(new MailChannel(account("localhost", true, "wrong-apples"), Optional.of(trusting)));
    assertTrue(words.startsWith("mail by localhost:"), words);
    assertFalse(words.contains("wrong-apples"), words);
  }

  @Test
  void aServerThatCannotProveItsNameIsRefused() {
    String unknown = failure(new MailChannel(account("localhost", true, PASSWORD)));
    assertTrue(unknown.contains("certification path"), unknown);
    String otherName =
        failure(new MailChannel(account("127.0.0.1", true, PASSWORD), Optional.of(trusting)));
    assertTrue(otherName.contains("127.0.0.1"), otherName);
  }

  @Test
  void withStartTlsAMessageArrivesAndNothingOfItWentInTheClear() throws Exception {
    try (StartTlsServer server = new StartTlsServer(serving)) {
      MailChannel.Account account =
          new MailChannel.Account(
              "localhost",
              server.port(),
              false,
              "cellar@brine.example",
              List.of("keeper@brine.example"),
              Optional.of(USER),
              Optional.of(Secret.of(PASSWORD)));
      Message message = Message.of(List.of(Notices.silent("FV2", 7)), Notices.NOON);
      new MailChannel(account, Optional.of(trusting)).send(message);
      assertEquals(2, server.plain.size(), server.plain::toString);
      assertTrue(server.plain.get(0).startsWith("EHLO"), server.plain::toString);
      assertEquals("STARTTLS", server.plain.get(1));
      String heard = String.join("\n", server.encrypted);
      assertTrue(heard.contains("RCPT TO:<keeper@brine.example>"), heard);
      assertTrue(heard.contains("Subject: Tunwarden: FV2: instrument silent"), heard);
      assertTrue(heard.contains("AUTH "), heard);
    }
  }

  @Test
  void withoutStartTlsNothingIsSent() {
    String words =
        failure(new MailChannel(account("localhost", false, PASSWORD), Optional.of(trusting)));
    assertTrue(words.contains("STARTTLS is required"), words);
  }

  @Test
  void aServerThatNeverAnswersIsGivenUp() throws Exception {
    try (ServerSocket silent = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
      MailChannel.Account account =
          new MailChannel.Account(
              "localhost",
              silent.getLocalPort(),
              false,
              "cellar@brine.example",
              List.of("keeper@brine.example"),
              Optional.empty(),
              Optional.empty());
      long begun = System.nanoTime();
      failure(new MailChannel(account, Optional.empty(), 500));
      assertTrue(System.nanoTime() - begun < 10_000_000_000L);
    }
  }
}

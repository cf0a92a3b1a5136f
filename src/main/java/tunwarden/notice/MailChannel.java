package tunwarden.notice;

import jakarta.mail.Message.RecipientType;
import jakarta.mail.MessagingException;
import jakarta.mail.Session;
import jakarta.mail.Transport;
import jakarta.mail.internet.InternetAddress;
import jakarta.mail.internet.MimeMessage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Date;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import javax.net.ssl.SSLSocketFactory;

/**
 * Writes an e-mail by SMTP. The connection is always encrypted, from its first byte or by STARTTLS,
 * which is then required, and the server must prove its name.
 */
public final class MailChannel implements Channel {
  private static final int TIMEOUT_MS = 15_000;

  private final Account account;
  private final Optional<SSLSocketFactory> trust;
  private final int timeoutMs;

  /**
   * A mail server and whom to write to.
   *
   * @param host its name, which its certificate must bear
   * @param port usually 587 with STARTTLS and 465 without
   * @param tls encrypted from the first byte; else STARTTLS is required
   * @param from sender
   * @param to receivers
   * @param user name to log in with, if any
   * @param password for it
   */
  public record Account(
      String host,
      int port,
      boolean tls,
      String from,
      List<String> to,
      Optional<String> user,
      Optional<Secret> password) {}

  public MailChannel(Account account) {
    this(account, Optional.empty());
  }

  /** With other certificates trusted than those of the system. */
  MailChannel(Account account, Optional<SSLSocketFactory> trust) {
    this(account, trust, TIMEOUT_MS);
  }

  MailChannel(Account account, Optional<SSLSocketFactory> trust, int timeoutMs) {
    this.account = account;
    this.trust = trust;
    this.timeoutMs = timeoutMs;
  }

  @Override
  public String name() {
    return "mail";
  }

  @Override
  public void send(Message message) throws IOException {
    Session session = Session.getInstance(properties());
    try {
      MimeMessage mail = new MimeMessage(session);
      mail.setFrom(new InternetAddress(account.from(), true));
      for (String receiver : account.to()) {
        mail.addRecipient(RecipientType.TO, new InternetAddress(receiver, true));
      }
      // A line break in a subject would begin another header.
      mail.setSubject(message.subject().replaceAll("\\p{Cntrl}", " "), "UTF-8");
      mail.setText(message.text(), StandardCharsets.UTF_8.name());
      mail.setSentDate(Date.from(message.made()));
      mail.setHeader("Auto-Submitted", "auto-generated"); // RFC 3834
      mail.saveChanges();
      deliver(session, mail);
    } catch (MessagingException failed) {
      throw new IOException(
          "mail by " + account.host() + ":" + account.port() + ": " + reason(failed), failed);
    }
  }

  private void deliver(Session session, MimeMessage mail) throws MessagingException {
    try (Transport transport = session.getTransport(account.tls() ? "smtps" : "smtp")) {
      if (account.user().isPresent()) {
        transport.connect(
            account.host(),
            account.port(),
            account.user().get(),
            account.password().map(Secret::reveal).orElse(""));
      } else {
        transport.connect(account.host(), account.port(), null, null);
      }
      transport.sendMessage(mail, mail.getAllRecipients());
    }
  }

  private Properties properties() {
    Properties properties = new Properties();
    String prefix = account.tls() ? "mail.smtps." : "mail.smtp.";
    for (String what : List.of("connectiontimeout", "timeout", "writetimeout")) {
      properties.put(prefix + what, String.valueOf(timeoutMs));
    }
    properties.put(prefix + "auth", String.valueOf(account.user().isPresent()));
    properties.put(prefix + "ssl.checkserveridentity", "true");
    properties.put(prefix + "ssl.protocols", "TLSv1.3 TLSv1.2");
    if (!account.tls()) {
      properties.put(prefix + "starttls.enable", "true");
      properties.put(prefix + "starttls.required", "true");
    }
    trust.ifPresent(factory -> properties.put(prefix + "ssl.socketFactory", factory));
    return properties;
  }

  private static String reason(MessagingException failed) {
    Throwable cause = failed;
    while (cause.getCause() != null && cause.getCause() != cause) {
      cause = cause.getCause();
    }
    return String.valueOf(cause.getMessage()).replaceAll("\\s+", " ").strip();
  }
}

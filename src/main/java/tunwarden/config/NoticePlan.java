package tunwarden.config;

import java.net.URI;
import java.util.List;
import java.util.Optional;
import tunwarden.notice.NoticeRules;

/**
 * Whom to tell of an alarm, as the cellar file says it. Secrets are never in the file: they stand
 * in files of their own.
 *
 * @param command program and arguments to run; empty for none
 * @param webhook address to post to
 * @param mail whom to write to
 * @param rules when to send
 */
public record NoticePlan(
    List<String> command, Optional<Webhook> webhook, Optional<Mail> mail, NoticeRules rules) {
  /** Nobody is told. */
  public static final NoticePlan NONE =
      new NoticePlan(List.of(), Optional.empty(), Optional.empty(), NoticeRules.USUAL);

  /** Keeps its own copy. */
  public NoticePlan {
    command = List.copyOf(command);
  }

  /**
   * An address to post to.
   *
   * @param url https, or http on this machine
   * @param tokenFile file with the bearer token
   */
  public record Webhook(URI url, Optional<String> tokenFile) {}

  /**
   * A mail server and whom to write to.
   *
   * @param host mail server
   * @param port its port
   * @param tls whether the connection is encrypted from its first byte; else STARTTLS is required
   * @param from sender
   * @param to receivers, at least one
   * @param user name to log in with
   * @param passwordFile file with the password
   */
  public record Mail(
      String host,
      int port,
      boolean tls,
      String from,
      List<String> to,
      Optional<String> user,
      Optional<String> passwordFile) {}
}

package tunwarden.config;

import java.net.URI;
import java.net.URISyntaxException;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tunwarden.alarm.Priority;
import tunwarden.notice.NoticeRules;
import tunwarden.units.BadInputException;

/** The {@code [notice]} table. */
final class NoticeReader {
  private static final Set<String> THIS_MACHINE = Set.of("localhost", "127.0.0.1", "[::1]");
  private static final int SUBMISSION_PORT = 587;
  private static final int MOST_PORT = 65_535;
  private static final int MOST_PER_HOUR = 3600;

  private NoticeReader() {}

  static NoticePlan read(Section notice) {
    List<String> command = notice.texts("command").orElse(List.of());
    Optional<NoticePlan.Webhook> webhook =
        notice.has("webhook") ? webhook(notice.section("webhook")) : Optional.empty();
    Optional<NoticePlan.Mail> mail =
        notice.has("mail") ? mail(notice.section("mail")) : Optional.empty();
    NoticeRules usual = NoticeRules.USUAL;
    NoticeRules rules =
        new NoticeRules(
            notice.parsed("from-priority", NoticeReader::priority).orElse(usual.least()),
            notice.parsed("together", ReadingsReader::duration).orElse(usual.together()),
            notice.whole("per-hour", 1, MOST_PER_HOUR).orElse(usual.perHour()));
    notice.close();
    return new NoticePlan(command, webhook, mail, rules);
  }

  private static Priority priority(String text) {
    return Arrays.stream(Priority.values())
        .filter(priority -> priority.word().equals(text))
        .findFirst()
        .orElseThrow(
            () ->
                new BadInputException(
                    "'" + text + "' is no priority; write advice, caution, warning or high"));
  }

  private static Optional<NoticePlan.Webhook> webhook(Section section) {
    Optional<URI> url = section.parsed("url", NoticeReader::url);
    Optional<String> token = section.text("token-file");
    section.require("url", "\"https://example.org/alarm\"");
    section.close();
    return url.map(address -> new NoticePlan.Webhook(address, token));
  }

  private static Optional<NoticePlan.Mail> mail(Section section) {
    Optional<String> host = section.text("host");
    Optional<String> from = section.parsed("from", NoticeReader::mailAddress);
    Optional<List<String>> to = section.texts("to");
    section.require("host", "\"mail.example.org\"");
    section.require("from", "\"cellar@example.org\"");
    section.require("to", "[\"you@example.org\"]");
    NoticePlan.Mail mail =
        new NoticePlan.Mail(
            host.orElse(""),
            section.whole("port", 1, MOST_PORT).orElse(SUBMISSION_PORT),
            section.flag("tls").orElse(false),
            from.orElse(""),
            to.orElse(List.of()),
            section.text("user"),
            section.text("password-file"));
    for (String receiver : mail.to()) {
      section.check("to", receiver, NoticeReader::mailAddress);
    }
    section.close();
    return Optional.of(mail);
  }

  private static URI url(String text) {
    try {
      URI url = new URI(text);
      boolean secure = "https".equals(url.getScheme());
      boolean here = "http".equals(url.getScheme()) && THIS_MACHINE.contains(url.getHost());
      if (url.getHost() != null && (secure || here)) {
        return url;
      }
    } catch (URISyntaxException ignored) {
      // told below, with what would be right
    }
    throw new BadInputException(
        "'" + text + "' will not do; write an https address, or http on this machine");
  }

  private static String mailAddress(String text) {
    if (!text.matches("[^\\s@<>\\p{Cntrl}]+@[^\\s@<>\\p{Cntrl}]+")) {
      throw new BadInputException("'" + text + "' is not an e-mail address");
    }
    return text;
  }
}

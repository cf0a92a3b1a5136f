package tunwarden.app.headless;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.config.Cellar;
import tunwarden.config.NoticePlan;
import tunwarden.notice.Channel;
import tunwarden.notice.CommandChannel;
import tunwarden.notice.MailChannel;
import tunwarden.notice.Secret;
import tunwarden.notice.WebhookChannel;

/** The ways to reach a person that a cellar file names, with their secrets. */
public final class Channels {
  /** Environment variable with the mail password, where no file is named. */
  static final String MAIL_PASSWORD = "TUNWARDEN_MAIL_PASSWORD";

  /** Environment variable with the webhook's token, where no file is named. */
  static final String WEBHOOK_TOKEN = "TUNWARDEN_WEBHOOK_TOKEN";

  private final Path folder;
  private final Map<String, String> environment;

  private Channels(Path folder, Map<String, String> environment) {
    this.folder = folder;
    this.environment = environment;
  }

  /**
   * The channels of a cellar; files of secrets stand beside the cellar file.
   *
   * @throws tunwarden.units.BadInputException when a secret cannot be read
   */
  public static List<Channel> of(Cellar cellar, Map<String, String> environment) {
    Path folder = cellar.file().toAbsolutePath().getParent();
    return new Channels(folder, environment).all(cellar.notice());
  }

  private List<Channel> all(NoticePlan plan) {
    List<Channel> channels = new ArrayList<>();
    if (!plan.command().isEmpty()) {
      channels.add(new CommandChannel(plan.command()));
    }
    plan.mail().ifPresent(mail -> channels.add(new MailChannel(account(mail))));
    plan.webhook()
        .ifPresent(
            hook ->
                channels.add(
                    new WebhookChannel(hook.url(), secret(hook.tokenFile(), WEBHOOK_TOKEN))));
    return channels;
  }

  private MailChannel.Account account(NoticePlan.Mail mail) {
    return new MailChannel.Account(
        mail.host(),
        mail.port(),
        mail.tls(),
        mail.from(),
        mail.to(),
        mail.user(),
        mail.user().isPresent() ? secret(mail.passwordFile(), MAIL_PASSWORD) : Optional.empty());
  }

  private Optional<Secret> secret(Optional<String> file, String variable) {
    return Secret.find(file.map(folder::resolve), variable, environment);
  }
}

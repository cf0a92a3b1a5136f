package tunwarden.app.headless;

import java.net.InetSocketAddress;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Optional;

/**
 * What the command line asks for.
 *
 * @param cellarFile the description of the cellar, read again when it changes
 * @param data folder for everything recorded
 * @param serve where to answer HTTP; empty for nowhere
 * @param token needed by those who ask, if given
 * @param resume how old recorded readings may be to begin the estimates with them
 */
public record HeadlessPlan(
    Path cellarFile,
    Path data,
    Optional<InetSocketAddress> serve,
    Optional<String> token,
    Duration resume) {
  /** A night's silence is bridged, a week's is not. */
  public static final Duration USUAL_RESUME = Duration.ofHours(6);
}

package tunwarden.app.headless;

import java.net.InetSocketAddress;
import java.nio.file.Path;
import java.util.Optional;

/**
 * What the command line asks for.
 *
 * @param cellarFile the description of the cellar, read again when it changes
 * @param data folder for everything recorded
 * @param serve where to answer HTTP; empty for nowhere
 * @param token needed by those who ask, if given
 */
public record HeadlessPlan(
    Path cellarFile, Path data, Optional<InetSocketAddress> serve, Optional<String> token) {}

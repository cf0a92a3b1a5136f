package tunwarden.app;

import java.io.IOException;
import java.net.InetSocketAddress;
import java.nio.file.Path;
import java.time.Instant;
import java.time.InstantSource;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import tunwarden.app.headless.HeadlessPlan;
import tunwarden.app.headless.HeadlessRun;
import tunwarden.app.headless.NoticeTrial;
import tunwarden.app.options.RecordingOptions;
import tunwarden.serve.ServeAddress;
import tunwarden.serve.TokenFile;

/** {@code headless}: records, raises alarms and answers HTTP with nobody at the screen. */
@Command(
    name = "headless",
    description = {
      "Watches, records, raises alarms and sends word with nobody at the screen, until stopped.",
      "Reads the cellar file again when it changes."
    },
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden headless --cellar cellar.toml --data /var/lib/tunwarden",
      "  tunwarden headless --data data --serve 0.0.0.0:9470 --token-file token.txt",
      "  tunwarden headless --test-notice"
    })
public final class HeadlessCommand implements Callable<Integer> {
  private static final String NOWHERE = "none";

  @Spec private CommandSpec spec;

  @Mixin private RecordingOptions recording = new RecordingOptions();

  @Option(
      names = "--serve",
      paramLabel = "ADDRESS",
      description = "Address and port to answer HTTP on, or none (default: ${DEFAULT-VALUE}).",
      defaultValue = ServeAddress.USUAL)
  private String serve;

  @Option(
      names = "--token-file",
      paramLabel = "F",
      description = "File with the token that others must give; needed beyond this computer.")
  private Path tokenFile;

  @Option(
      names = "--test-notice",
      description = "Send a test by every way of [notice], say what became of it, and end.")
  private boolean testNotice;

  @Override
  public Integer call() throws IOException {
    if (testNotice) {
      boolean all =
          NoticeTrial.run(recording.cellarFile(), Instant.now(), spec.commandLine().getOut());
      return all ? 0 : Faults.FAILED;
    }
    Path data =
        recording
            .data()
            .orElseThrow(
                () ->
                    new ParameterException(
                        spec.commandLine(),
                        "Say with --data DIR where everything is to be recorded."));
    Optional<InetSocketAddress> address =
        serve.equals(NOWHERE) ? Optional.empty() : Optional.of(ServeAddress.parse(serve));
    Optional<String> token =
        tokenFile == null ? Optional.empty() : Optional.of(TokenFile.read(tokenFile));
    HeadlessPlan plan = new HeadlessPlan(recording.cellarFile(), data, address, token);
    HeadlessRun.untilStopped(plan, InstantSource.system(), spec.commandLine().getOut());
    return 0;
  }
}

package tunwarden.app.options;

import java.nio.file.Path;
import java.util.Optional;
import picocli.CommandLine.Option;
import tunwarden.config.CellarFile;

/** What is watched and where it is recorded. */
public final class RecordingOptions {
  @Option(
      names = "--cellar",
      paramLabel = "F",
      description = "Cellar file (default: ${DEFAULT-VALUE}).",
      defaultValue = CellarFile.USUAL_NAME)
  private Path cellarFile;

  @Option(
      names = "--data",
      paramLabel = "DIR",
      description = "Folder for everything recorded; made if absent, one program at a time.")
  private Path data;

  public Path cellarFile() {
    return cellarFile;
  }

  public Optional<Path> data() {
    return Optional.ofNullable(data);
  }
}

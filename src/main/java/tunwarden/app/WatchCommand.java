package tunwarden.app;

import java.io.IOException;
import java.nio.file.Path;
import java.time.InstantSource;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import tunwarden.app.board.LiveDashboard;
import tunwarden.app.options.RecordingOptions;
import tunwarden.app.options.ScreenOptions;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.serial.SerialLinks;

/** {@code watch}: the dashboard over the instruments of a cellar file. */
@Command(
    name = "watch",
    description = "Shows the dashboard over the instruments of a cellar file.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden watch",
      "  tunwarden watch --data data",
      "  tunwarden watch --cellar lower-cellar.toml --theme monochrome --ascii"
    })
public final class WatchCommand implements Callable<Integer> {
  @Mixin private RecordingOptions recording = new RecordingOptions();

  @Mixin private ScreenOptions screen = new ScreenOptions();

  @Override
  public Integer call() throws IOException {
    watch(recording.cellarFile(), recording.data(), screen);
    return 0;
  }

  static void watch(Path cellarFile, Optional<Path> data, ScreenOptions screen) throws IOException {
    Cellar cellar = CellarFile.read(cellarFile);
    LiveDashboard.run(cellar, data, Fronts.of(screen), new SerialLinks(), InstantSource.system());
  }
}

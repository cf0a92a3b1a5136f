package tunwarden.app;

import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import tunwarden.app.board.Front;
import tunwarden.app.board.LookFile;
import tunwarden.app.options.ScreenOptions;

/** Makes the person's side of a dashboard from options, the terminal and the state directory. */
final class Fronts {
  private Fronts() {}

  static Front of(ScreenOptions screen) {
    Path state = LogFile.path().getParent();
    LookFile looks = new LookFile(state);
    return new Front(
        screen.look(looks.load(), Streams.isUnicode()),
        looks,
        screen.window(),
        screen.bell(),
        strayOutput(state),
        ZoneId.systemDefault());
  }

  /** Anything that a library prints while the screen is up ends here. */
  private static OutputStream strayOutput(Path state) {
    try {
      Files.createDirectories(state);
      return Files.newOutputStream(state.resolve("stray-output.log"));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

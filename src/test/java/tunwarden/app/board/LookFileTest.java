package tunwarden.app.board;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Theme;
import tunwarden.units.Display;

class LookFileTest {
  @TempDir private Path folder;

  @Test
  void whatWasKeptComesBack() {
    Look look = new Look(Display.US, Theme.MONOCHROME, Glyphs.BRAILLE);
    new LookFile(folder.resolve("state")).keep(look);
    assertEquals(look, new LookFile(folder.resolve("state")).load());
  }

  @Test
  void withoutAFileTheUsualLookIsShown() {
    assertEquals(Look.USUAL, new LookFile(folder).load());
  }

  @Test
  void nonsenseInTheFileFallsBackToTheUsual() throws IOException {
    Files.writeString(folder.resolve("look.properties"), "units=furlongs\ntheme=\\u12\nglyphs");
    assertEquals(Look.USUAL, new LookFile(folder).load());
  }
}

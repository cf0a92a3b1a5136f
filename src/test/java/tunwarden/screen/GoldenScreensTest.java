package tunwarden.screen;

import java.io.IOException;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Theme;
import tunwarden.screen.model.Update;
import tunwarden.screen.view.ScreenView;
import tunwarden.units.Display;

/** Every page at three sizes, in block and plain-ASCII drawing, the chart in Braille as well. */
class GoldenScreensTest {
  private static final Size[] SIZES = {new Size(80, 24), new Size(120, 40), new Size(200, 60)};

  static Stream<Arguments> screens() {
    return Stream.of(SIZES)
        .flatMap(
            size ->
                Stream.of(Page.values())
                    .flatMap(
                        page ->
                            Stream.of(Glyphs.values())
                                .filter(g -> g != Glyphs.BRAILLE || page == Page.VESSEL)
                                .map(g -> Arguments.of(page, size, g))));
  }

  @ParameterizedTest
  @MethodSource("screens")
  void looksAsRecorded(Page page, Size size, Glyphs glyphs) throws IOException {
    Look look = new Look(Display.METRIC, Theme.DARK, glyphs);
    Model start = Model.start(Boards.three(Origin.REHEARSAL, Boards.NOW), look, size);
    Model model = Update.key(start, Key.typed(page.letter())).model();
    String name =
        page.name().toLowerCase(Locale.ROOT)
            + "-"
            + size.columns()
            + "x"
            + size.rows()
            + "-"
            + glyphs.name().toLowerCase(Locale.ROOT);
    GoldenFile.check(name, ScreenView.draw(model).text());
  }

  static Stream<Arguments> tables() {
    return Stream.of(SIZES)
        .flatMap(
            size ->
                Stream.of(Glyphs.BLOCKS, Glyphs.ASCII).map(glyphs -> Arguments.of(size, glyphs)));
  }

  /** The table of what may happen, its third row told in full. */
  @ParameterizedTest
  @MethodSource("tables")
  void theTableOfWhatMayHappenLooksAsRecorded(Size size, Glyphs glyphs) throws IOException {
    Look look = new Look(Display.METRIC, Theme.DARK, glyphs);
    Model model = Model.start(Boards.three(Origin.REHEARSAL, Boards.NOW), look, size);
    for (Key key :
        new Key[] {
          Key.typed('v'), Key.typed('f'), Key.of(Key.Kind.RIGHT), Key.of(Key.Kind.RIGHT)
        }) {
      model = Update.key(model, key).model();
    }
    String name =
        "whatif-"
            + size.columns()
            + "x"
            + size.rows()
            + "-"
            + glyphs.name().toLowerCase(Locale.ROOT);
    GoldenFile.check(name, ScreenView.draw(model).text());
  }
}

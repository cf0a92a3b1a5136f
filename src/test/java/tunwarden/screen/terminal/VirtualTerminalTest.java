package tunwarden.screen.terminal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.screen.Boards;
import tunwarden.screen.GoldenFile;
import tunwarden.screen.RecordingDesk;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Theme;
import tunwarden.screen.model.Turn;
import tunwarden.screen.model.Update;
import tunwarden.screen.view.Canvas;
import tunwarden.units.Display;

/** What reaches the terminal: themes, wide characters, resizing, and any keys whatever. */
class VirtualTerminalTest {
  private static final Size SIZE = new Size(80, 24);
  private static final List<Size> SIZES = List.of(SIZE, new Size(120, 40), new Size(200, 60));

  @ParameterizedTest
  @EnumSource(Theme.class)
  void everyThemePaintsEveryPageAsRecorded(Theme theme) throws IOException {
    Look look = new Look(Display.METRIC, theme, Glyphs.BLOCKS);
    StringBuilder all = new StringBuilder();
    for (Size size : SIZES) {
      for (Page page : Page.values()) {
        Virtual virtual = new Virtual(size);
        Model start = Model.start(Boards.three(Origin.REHEARSAL, Boards.NOW), look, size);
        Canvas canvas = virtual.show(Update.key(start, Key.typed(page.letter())).model());
        assertEquals(canvas.text(), virtual.text(), page + " in " + theme);
        String head = page.title() + " " + size.columns() + "x" + size.rows();
        all.append(head).append('\n').append(virtual.paint()).append('\n');
      }
    }
    GoldenFile.check("paint-" + theme.name().toLowerCase(Locale.ROOT), all.toString());
  }

  @Test
  void wideAndCombiningTitlesLeaveTheColumnsWhereTheyWere() throws IOException {
    String[] titles = {"plain", "清酒 tank", "x\u0323y\u0301z", "🍺 fest", "한국 라거 아주 긴 이름입니다", ""};
    for (String title : titles) {
      Virtual virtual = new Virtual(SIZE);
      Board board =
          Boards.board(
              Origin.LIVE,
              Boards.NOW,
              List.of(Boards.vessel("T1", title, 0.5, 4, Boards.NOW, List.of())));
      Canvas canvas = virtual.show(Model.start(board, Look.USUAL, SIZE));
      assertEquals(canvas.text(), virtual.text(), title);
      String row = virtual.text().lines().skip(3).findFirst().orElseThrow();
      assertTrue(row.contains("0.50    4.0    5.31 ±0.14   +0.89 59 %"), row);
    }
  }

  @Test
  void aStormOfResizesNeverGarblesOrThrows() throws IOException {
    Random random = new Random(3);
    Virtual virtual = new Virtual(SIZE);
    Model model = Model.start(Boards.three(Origin.REPLAY, Boards.NOW), Look.USUAL, SIZE);
    for (int i = 0; i < 400; i++) {
      Size size = new Size(1 + random.nextInt(220), 1 + random.nextInt(70));
      virtual.resize(size);
      Page page = Page.values()[random.nextInt(Page.values().length)];
      model = Update.key(model, Key.typed(page.letter())).model();
      Canvas canvas = virtual.show(model);
      assertEquals(size.columns(), canvas.columns());
      assertEquals(canvas.text(), virtual.text(), page + " at " + size);
    }
  }

  @Test
  void anyHundredThousandKeysNeverThrow() throws IOException {
    Random random = new Random(20260302);
    Virtual virtual = new Virtual(new Size(100, 32));
    Board[] boards = {
      Boards.three(Origin.REPLAY, Boards.NOW),
      Boards.three(Origin.LIVE, Boards.NOW),
      Boards.board(Origin.LIVE, Boards.NOW, List.of())
    };
    Model model = Model.start(boards[0], Look.USUAL, new Size(100, 32));
    RecordingDesk desk = new RecordingDesk();
    for (int i = 0; i < 100_000; i++) {
      Turn turn = Update.key(model, randomKey(random));
      turn.requests().forEach(request -> request.of(desk));
      model = turn.model();
      if (model.over()) {
        model = Model.start(boards[random.nextInt(boards.length)], model.look(), model.size());
      }
      if (i % 100 == 0) {
        model = model.withBoard(boards[random.nextInt(boards.length)]);
        Canvas canvas = virtual.show(model);
        assertEquals(canvas.text(), virtual.text());
      }
    }
    assertTrue(desk.asked().size() > 1_000, "the keys must have reached the desk now and then");
  }

  private static Key randomKey(Random random) {
    int choice = random.nextInt(10);
    if (choice < 6) {
      return Key.typed(' ' + random.nextInt(95));
    }
    if (choice == 6) {
      return Key.typed(random.nextInt(0x3000));
    }
    Key.Kind[] kinds = Key.Kind.values();
    return Key.of(kinds[random.nextInt(kinds.length)]);
  }
}

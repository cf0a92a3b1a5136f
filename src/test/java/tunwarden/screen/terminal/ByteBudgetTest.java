package tunwarden.screen.terminal;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.ansi.ANSITerminal;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.assess.History;
import tunwarden.screen.Boards;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Update;
import tunwarden.screen.model.VesselBoard;
import tunwarden.screen.view.ScreenView;

/** What goes over the wire at one reading a second, so that a slow remote shell stays pleasant. */
class ByteBudgetTest {
  private static final int MOST_BYTES_PER_S = 2_048;
  private static final int SECONDS = 120;
  private static final Size SIZE = new Size(120, 40);

  /** An ANSI terminal of a fixed size that writes to a stream. */
  private static final class Wire extends ANSITerminal {
    Wire(OutputStream out) {
      super(new ByteArrayInputStream(new byte[0]), out, StandardCharsets.UTF_8);
    }

    @Override
    protected TerminalSize findTerminalSize() {
      return new TerminalSize(SIZE.columns(), SIZE.rows());
    }
  }

  @ParameterizedTest
  @EnumSource(
      value = Page.class,
      names = {"CELLAR", "VESSEL"})
  void oneVesselAtOneHertzSendsLittle(Page page) throws IOException {
    ByteArrayOutputStream wire = new ByteArrayOutputStream();
    TerminalScreen screen = new TerminalScreen(new Wire(wire));
    screen.startScreen();
    Painter painter = new Painter(screen);
    Random random = new Random(5);
    History history = new History();
    int sent = 0;
    int most = 0;
    for (int s = -7_200; s < SECONDS; s++) {
      Instant now = Boards.NOW.plusSeconds(s);
      double bar = 0.88 + 1e-5 * s + 0.002 * random.nextGaussian();
      history.addPressure(now.minusSeconds(1), bar * 1e5);
      history.addTemperature(now.minusSeconds(1), 277.3 + 0.05 * random.nextGaussian());
      if (s < 0) {
        continue;
      }
      wire.reset();
      Model model = Model.start(board(bar, history, now), Look.USUAL, SIZE);
      painter.paint(
          ScreenView.draw(Update.key(model, Key.typed(page.letter())).model()),
          model.look().theme());
      screen.refresh(Screen.RefreshType.DELTA);
      if (s > 0) {
        sent += wire.size();
        most = Math.max(most, wire.size());
      }
    }
    int mean = sent / (SECONDS - 1);
    assertTrue(mean <= MOST_BYTES_PER_S, page + ": " + mean + " bytes/s, most " + most);
  }

  private static Board board(double bar, History history, Instant now) {
    VesselBoard made = Boards.vessel("FV2", "pale ale", bar, 4.2, now, List.of());
    VesselBoard vessel = new VesselBoard(made.assessment(), made.alarms(), history, List.of());
    return Boards.board(Origin.LIVE, now, List.of(vessel));
  }
}

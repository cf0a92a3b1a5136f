package tunwarden.screen.terminal;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.virtual.DefaultVirtualTerminal;
import java.io.IOException;
import java.time.Instant;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import tunwarden.assess.History;
import tunwarden.screen.Boards;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Update;
import tunwarden.screen.view.Canvas;
import tunwarden.screen.view.ScreenView;

/** Cost of a frame with 24 vessels, of one history sample, and of one chart's worth of history. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class ScreenBenchmark {
  @Param({"CELLAR", "VESSEL", "VENT", "JOURNAL"})
  Page page;

  @Param({"120x40", "200x60"})
  String size;

  private Model model;
  private Board board;
  private TerminalScreen screen;
  private Painter painter;
  private long second;
  private final History history = new History();

  /** Makes the board once. */
  @Setup
  public void prepare() throws IOException {
    String[] parts = size.split("x");
    Size cells = new Size(Integer.parseInt(parts[0]), Integer.parseInt(parts[1]));
    board = Boards.many(24, Boards.NOW);
    Model start = Model.start(board, Look.USUAL, cells);
    model = Update.key(start, Key.typed(page.letter())).model();
    screen =
        new TerminalScreen(
            new DefaultVirtualTerminal(new TerminalSize(cells.columns(), cells.rows())));
    screen.startScreen();
    painter = new Painter(screen);
    for (int s = 0; s < 7 * 86_400; s++) {
      history.addPressure(Boards.NOW.minusSeconds(s), 88_000 + s % 100);
    }
  }

  /** Drawing on the canvas alone. */
  @Benchmark
  public Canvas draw() {
    return ScreenView.draw(model);
  }

  /** Drawing a new second and sending what changed. */
  @Benchmark
  public void frame() throws IOException {
    Instant now = Boards.NOW.plusSeconds(++second % 20);
    Model next = model.withBoard(Boards.at(board, now));
    painter.paint(ScreenView.draw(next), next.look().theme());
    screen.refresh(Screen.RefreshType.DELTA);
  }

  /** One sample into the history. */
  @Benchmark
  public void remember() {
    history.addPressure(Boards.NOW.plusSeconds(++second), 88_000);
  }

  /** A week of history in 300 columns. */
  @Benchmark
  public History.Window week() {
    return history.window(Boards.NOW.minusSeconds(7 * 86_400), Boards.NOW, 300);
  }

  /** Runs all of it. */
  public static void main(String[] args) throws RunnerException {
    new Runner(new OptionsBuilder().include(ScreenBenchmark.class.getSimpleName()).build()).run();
  }
}

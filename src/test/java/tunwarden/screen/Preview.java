package tunwarden.screen;

import java.io.OutputStream;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Theme;
import tunwarden.screen.terminal.Dashboard;
import tunwarden.screen.terminal.DashboardOptions;
import tunwarden.units.Display;

/** The dashboard on an invented board, to look at: arguments are origin, theme and glyphs. */
public final class Preview {
  private Preview() {}

  /** Runs until left. */
  public static void main(String[] args) {
    Origin origin = args.length > 0 ? Origin.valueOf(args[0]) : Origin.REHEARSAL;
    Theme theme = args.length > 1 ? Theme.valueOf(args[1]) : Theme.DARK;
    Glyphs glyphs = args.length > 2 ? Glyphs.valueOf(args[2]) : Glyphs.BLOCKS;
    Look look = new Look(Display.METRIC, theme, glyphs);
    Instant start = Instant.now().truncatedTo(ChronoUnit.SECONDS);
    Board board = Boards.three(origin, start);
    Dashboard.run(
        () -> Boards.at(board, Instant.now()),
        new RecordingDesk(),
        new DashboardOptions(look, false, true, OutputStream.nullOutputStream(), () -> {}));
  }
}

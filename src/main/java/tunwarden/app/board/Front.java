package tunwarden.app.board;

import java.io.OutputStream;
import java.time.ZoneId;
import tunwarden.screen.model.Look;
import tunwarden.screen.terminal.DashboardOptions;

/**
 * What a dashboard needs from the person's side.
 *
 * @param look to begin with
 * @param looks keeps it for the next start
 * @param window a window of its own instead of the terminal
 * @param bell whether a new alarm rings the bell
 * @param strayOutput where anything printed goes while the screen is up
 * @param zone for times of day
 */
public record Front(
    Look look,
    LookFile looks,
    boolean window,
    boolean bell,
    OutputStream strayOutput,
    ZoneId zone) {
  DashboardOptions options(Runnable onceShown) {
    return new DashboardOptions(look, window, bell, strayOutput, onceShown);
  }
}

package tunwarden.screen.terminal;

import java.io.OutputStream;
import tunwarden.screen.model.Look;

/**
 * How the dashboard is to run.
 *
 * @param look units, theme and glyphs to begin with
 * @param window a window of its own instead of the terminal
 * @param bell whether a new alarm rings the terminal bell
 * @param strayOutput where standard output and error go while the screen is up
 * @param onceShown what can wait until the first frame is up; runs on the drawing thread, so it
 *     only begins things
 */
public record DashboardOptions(
    Look look, boolean window, boolean bell, OutputStream strayOutput, Runnable onceShown) {}

/** The terminal itself; the only place that knows the terminal library. */
package tunwarden.screen.terminal;

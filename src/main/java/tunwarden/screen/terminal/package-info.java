/**
 * The dashboard on a real terminal: keys in, cells out. The only package that knows the terminal
 * library. Drawing has a thread of its own and looks only at the latest board, so a stalled
 * terminal never holds up readings, alarms or recording.
 */
package tunwarden.screen.terminal;

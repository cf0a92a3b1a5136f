/** The packaged program in a real terminal, driven and read through tmux. */
package tunwarden.terminal;

/** The {@code instruments} command: profiles, ports, and a look at what a line says. */
package tunwarden.app.instruments;

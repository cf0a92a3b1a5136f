/** Commands, wiring, start and stop order, exit codes. */
package tunwarden.app;

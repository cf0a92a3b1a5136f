/** Pseudo-terminal pairs for tests that need a real serial port. */
package tunwarden.pty;

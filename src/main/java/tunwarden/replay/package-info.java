/** Logs: rows in and out, foreign CSV, the data-time clock. */
package tunwarden.replay;

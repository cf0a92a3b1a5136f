/** What the dashboard remembers: page, selection, units; pure update from keys and snapshots. */
package tunwarden.screen.model;

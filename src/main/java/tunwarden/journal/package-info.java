/** What is kept on disk: readings by day, events by month, repair and reading back. */
package tunwarden.journal;

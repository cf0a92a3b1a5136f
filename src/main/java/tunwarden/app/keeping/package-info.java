/** What a recording program keeps across restarts, with or without a screen. */
package tunwarden.app.keeping;

/** What stands in which column of a log: our own format, a stated one, or one guessed aloud. */
package tunwarden.replay.layout;

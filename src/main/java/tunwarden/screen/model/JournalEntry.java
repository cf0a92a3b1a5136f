package tunwarden.screen.model;

import java.time.Instant;

/**
 * Something that was written down.
 *
 * @param time when it happened, data time
 * @param vessel identity of the vessel; empty for the station itself
 * @param kind one word: an event kind, {@code alarm}, {@code note}, {@code start}
 * @param text one sentence
 */
public record JournalEntry(Instant time, String vessel, String kind, String text) {}

package tunwarden.reading;

import java.time.Instant;

/**
 * A remark written into a log at a time, such as {@code "valve closed"}.
 *
 * @param time when it happened
 * @param vessel identity of the vessel
 * @param text what was written
 */
public record Mark(Instant time, String vessel, String text) implements Sample {}

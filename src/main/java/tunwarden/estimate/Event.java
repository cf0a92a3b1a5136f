package tunwarden.estimate;

import java.time.Instant;

/**
 * Something that happened, found in the readings.
 *
 * @param kind what
 * @param vessel identity of the vessel
 * @param time when it began
 * @param until when it ended, or the latest time seen while it goes on
 * @param open whether it still goes on
 * @param fromPaGauge pressure when it began, Pa gauge
 * @param toPaGauge pressure when it ended, Pa gauge
 * @param gasKg gas that left (positive) or entered (negative), kg; 0 where none moved
 * @param confidence 0..1
 * @param why the evidence, in words
 */
public record Event(
    EventKind kind,
    String vessel,
    Instant time,
    Instant until,
    boolean open,
    double fromPaGauge,
    double toPaGauge,
    double gasKg,
    double confidence,
    String why) {}

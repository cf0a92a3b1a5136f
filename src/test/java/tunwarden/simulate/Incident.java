package tunwarden.simulate;

/**
 * Something that truly happened.
 *
 * @param kind the word the report uses
 * @param from seconds since the start
 * @param until seconds since the start
 * @param gasKg CO2 that left, kg; negative when it came in
 */
public record Incident(String kind, double from, double until, double gasKg) {}

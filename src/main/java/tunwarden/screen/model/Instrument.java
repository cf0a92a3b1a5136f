package tunwarden.screen.model;

import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;

/**
 * One instrument's health, a row of the signals page.
 *
 * @param vessel identity of the vessel it reads
 * @param quantity what it measures
 * @param device name of its profile, or of the log column in a replay
 * @param port port or file it is heard on
 * @param quality of its newest word
 * @param value newest value in SI, if there is one
 * @param heard when it last said anything, data time
 * @param good readings accepted since the start
 * @param bad readings refused since the start
 * @param words what a person should know: "port gone, trying again in 3 s"; may be empty
 */
public record Instrument(
    String vessel,
    Quantity quantity,
    String device,
    String port,
    Quality quality,
    OptionalDouble value,
    Optional<Instant> heard,
    long good,
    long bad,
    String words) {}

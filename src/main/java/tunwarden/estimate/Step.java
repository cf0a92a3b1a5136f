package tunwarden.estimate;

import java.util.List;
import tunwarden.reading.Quality;

/**
 * The result of one step.
 *
 * @param outcome what became of the sample
 * @param quality the sample's quality after the gates have seen it
 * @param reason why, in words; empty when accepted
 * @param next the state that follows; the previous one if nothing was used
 * @param events events that began, changed or ended in this step
 */
public record Step(
    Outcome outcome, Quality quality, String reason, State next, List<Event> events) {}

package tunwarden.screen.model;

import java.time.Duration;
import java.util.Optional;

/**
 * Work that takes more than a moment, such as reading a long log.
 *
 * @param words what is being done: "reading brewhouse.csv"
 * @param share how much is done, 0..1
 * @param left estimate of the time left, once there is one
 */
public record Progress(String words, double share, Optional<Duration> left) {}

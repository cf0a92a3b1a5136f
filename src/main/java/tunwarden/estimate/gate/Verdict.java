package tunwarden.estimate.gate;

import tunwarden.reading.Quality;

/**
 * What the gates say about one reading.
 *
 * @param quality good, or the first reason against it
 * @param reason in words; empty when good
 * @param usable whether it may move the belief
 * @param track what to remember
 */
public record Verdict(Quality quality, String reason, boolean usable, Track track) {}

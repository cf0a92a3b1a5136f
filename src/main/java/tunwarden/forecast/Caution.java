package tunwarden.forecast;

/**
 * A short, specific warning shown where the decision is made.
 *
 * @param grave whether a life or a vessel is at stake
 * @param text one sentence
 */
public record Caution(boolean grave, String text) {}

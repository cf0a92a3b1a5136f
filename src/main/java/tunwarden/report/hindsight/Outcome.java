package tunwarden.report.hindsight;

/**
 * What one assumption leads to.
 *
 * @param assumption the assumption
 * @param log log of prior and likelihood, but for a constant
 * @param mean of the states of {@link Manner} at the end
 * @param covariance theirs
 */
record Outcome(Assumption assumption, double log, double[] mean, double[][] covariance) {}

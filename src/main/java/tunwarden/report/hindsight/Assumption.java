package tunwarden.report.hindsight;

/**
 * What is assumed for one run through the log.
 *
 * @param transferPerS kLa
 * @param roomShare headspace over the one that follows from the stated fill
 * @param mean states of {@link Manner} at first
 * @param variance theirs
 * @param logPrior log of how likely it is beforehand, but for a constant
 * @param odd whether it is one that the look back does not go by: much air, or fermentation
 */
record Assumption(
    double transferPerS,
    double roomShare,
    double[] mean,
    double[] variance,
    double logPrior,
    boolean odd) {}

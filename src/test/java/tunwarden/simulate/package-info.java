/**
 * Vessels with a known truth, for judging the estimator. Nothing here uses the estimator's model:
 * the solubility, the gas law, the integrator and its step are written out again, and every
 * constant that a real cellar would not know is drawn at random.
 */
package tunwarden.simulate;

/** Whole answers: a value with its interval, the correlations behind it and what limits it. */
package tunwarden.physics.answer;

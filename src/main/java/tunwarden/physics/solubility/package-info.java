/**
 * How much gas a liquid holds: published relations, each on its own, and their choice per drink.
 */
package tunwarden.physics.solubility;

/** Gases and their blends: molar masses, virial coefficients, fugacity. */
package tunwarden.physics.gas;

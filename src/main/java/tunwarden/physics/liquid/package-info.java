/** Liquids as a person describes them, and their densities. */
package tunwarden.physics.liquid;

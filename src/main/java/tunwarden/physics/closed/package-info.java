/** A closed vessel: gas shared between liquid and headspace at equilibrium. */
package tunwarden.physics.closed;

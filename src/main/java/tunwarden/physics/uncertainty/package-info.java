/** Propagation of uncertainty by the rules of JCGM 100. */
package tunwarden.physics.uncertainty;

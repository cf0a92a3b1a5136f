/** Simulated vessels in place of instruments. */
package tunwarden.rehearse;

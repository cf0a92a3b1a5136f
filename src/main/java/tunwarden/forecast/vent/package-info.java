/** Trying a vent before anyone turns a handle: what leaves, what follows, what is left. */
package tunwarden.forecast.vent;

/**
 * What the liquid really holds: hidden state, process model, gates, events. {@code step(state,
 * sample)} returns a new state and never throws for bad data.
 */
package tunwarden.estimate;

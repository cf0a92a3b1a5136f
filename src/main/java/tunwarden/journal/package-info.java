/**
 * Recording, and reading back: day files of readings and estimates, a month file of events, the
 * state that survives a restart. One thread writes; alarm transitions are forced to disk before
 * anybody is told of them.
 */
package tunwarden.journal;

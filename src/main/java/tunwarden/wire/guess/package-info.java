/** Guesses at how an unknown instrument speaks, from what it was heard to send. */
package tunwarden.wire.guess;

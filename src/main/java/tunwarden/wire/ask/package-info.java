/** Asking an instrument: questions, what comes of them, and whose turn it is on a shared line. */
package tunwarden.wire.ask;

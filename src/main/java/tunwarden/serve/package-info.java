/** The loopback HTTP server: metrics, state, health, events, status page. */
package tunwarden.serve;

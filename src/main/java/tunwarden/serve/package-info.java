/**
 * What other programs and a phone may ask over HTTP: metrics, state, health, events and a status
 * page. Loopback unless a token is given; nothing here can change anything.
 */
package tunwarden.serve;

/**
 * What the dashboard knows and how it changes: the board it is given, the model of what a person is
 * looking at, and a pure update from keys and boards. Nothing here draws.
 */
package tunwarden.screen.model;

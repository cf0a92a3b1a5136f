/**
 * What the dashboard looks like: pure functions from the model to a canvas of cells. Knows no
 * terminal library; colour is a role, given its paint by the theme.
 */
package tunwarden.screen.view;

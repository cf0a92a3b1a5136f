/** The dashboard: model, view and terminal. */
package tunwarden.screen;

/** Drawing as pure functions from model to cells. */
package tunwarden.screen.view;

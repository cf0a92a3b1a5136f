/** Making and checking cellar files. */
package tunwarden.app.cellar;

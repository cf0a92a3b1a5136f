/** Options that several commands share, and how their texts become quantities. */
package tunwarden.app.options;

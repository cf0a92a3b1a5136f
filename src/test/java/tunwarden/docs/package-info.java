/** Runs what the pages for users show. */
package tunwarden.docs;

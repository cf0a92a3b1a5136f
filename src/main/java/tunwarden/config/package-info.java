/** Cellar file and device profiles, read into validated records. */
package tunwarden.config;

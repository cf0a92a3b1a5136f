/** Device profiles: finding them, and reading their JSON into validated records. */
package tunwarden.config.profile;

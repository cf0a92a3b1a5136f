/** What would follow: scenarios computed from the present estimate, each with its spread. */
package tunwarden.forecast;

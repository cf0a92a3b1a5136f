/** One immutable snapshot of everything the outputs need to know about a vessel. */
package tunwarden.assess;

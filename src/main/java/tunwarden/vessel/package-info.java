/** What a person tells about a vessel: geometry, liquid, gas, limits, site. Immutable. */
package tunwarden.vessel;

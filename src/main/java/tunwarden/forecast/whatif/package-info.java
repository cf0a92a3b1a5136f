/** What may happen to a vessel or be done to it, each worked out beforehand from what was told. */
package tunwarden.forecast.whatif;

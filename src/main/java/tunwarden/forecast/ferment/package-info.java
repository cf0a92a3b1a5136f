/** Gas made by fermentation: how much is still to come and how fast. */
package tunwarden.forecast.ferment;

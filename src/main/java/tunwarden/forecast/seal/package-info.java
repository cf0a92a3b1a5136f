/** Closing a vessel that still ferments: how far the pressure would go, and where to hold it. */
package tunwarden.forecast.seal;

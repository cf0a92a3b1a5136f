/** The room the gas goes into: dilution, oxygen left, and the exposure limits in force. */
package tunwarden.forecast.room;

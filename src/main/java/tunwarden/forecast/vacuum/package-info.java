/** How a sealed vessel comes under vacuum, and how a full one comes under pressure. */
package tunwarden.forecast.vacuum;

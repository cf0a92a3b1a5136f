/** One measured value with its time, vessel, quantity and quality; and the absence of one. */
package tunwarden.reading;

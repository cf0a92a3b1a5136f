/** Serial ports: opening, reconnecting, pacing. The only place that knows the serial library. */
package tunwarden.serial;

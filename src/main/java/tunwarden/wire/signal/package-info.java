/** From a number on the wire to a quantity in SI: units, current loops, resistance, calibration. */
package tunwarden.wire.signal;

/** The running loop: one writer, readings in, assessments out to the sinks. */
package tunwarden.station;

/** The other end of the wire: an instrument of a profile played by the program. */
package tunwarden.wire.simulate;

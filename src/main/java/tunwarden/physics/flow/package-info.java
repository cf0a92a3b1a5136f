/** Gas through orifices and relief valves. */
package tunwarden.physics.flow;

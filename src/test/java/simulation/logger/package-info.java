/** Probes, transducers and the logger that writes what they say, in the manner of the plant that owns it. */
package simulation.logger;

/** A steam chamber and what is piped to it: balances of mass and energy, stepped through time. */
package simulation.plant;

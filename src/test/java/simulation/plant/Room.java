package simulation.plant;

/**
 * The room round the chamber.
 *
 * @param celsius its temperature
 * @param pascal pressure of the atmosphere
 */
public record Room(double celsius, double pascal) {}

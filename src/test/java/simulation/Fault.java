package simulation;

/**
 * What was imposed on the run.
 *
 * @param kind air-pocket, residual-air, superheat and the like
 * @param place where
 * @param from seconds since the run began
 * @param to seconds since the run began
 * @param size how much
 * @param unit of the size
 */
public record Fault(String kind, String place, double from, double to, double size, String unit) {}

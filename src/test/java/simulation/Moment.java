package simulation;

import java.util.List;
import simulation.plant.Body;
import simulation.plant.GasState;
import simulation.plant.Ledger;
import simulation.plant.Plant;
import simulation.plant.Spot;

/**
 * The plant at one whole second, as it truly was.
 *
 * @param seconds since the run began
 * @param gas what the gas was like
 * @param spots temperatures of the places, in their order
 * @param waterKg water in the chamber without the condensate at its bottom
 * @param contentsJoule energy of water and air
 * @param waterJoule energy of the water
 * @param sumpKg condensate at the bottom
 * @param sumpJoule its enthalpy
 * @param metalJoule heat content of the metal
 * @param loadJoule heat content of the load
 * @param ledger all sums so far
 */
public record Moment(
        double seconds,
        GasState gas,
        List<Double> spots,
        double waterKg,
        double contentsJoule,
        double waterJoule,
        double sumpKg,
        double sumpJoule,
        double metalJoule,
        double loadJoule,
        Ledger ledger) {

    static Moment of(Plant plant, List<Spot> spots) {
        return new Moment(
                plant.timeline().now(),
                plant.gas(),
                spots.stream().map(Spot::celsius).toList(),
                plant.contents().waterKg(),
                plant.contents().joule(),
                plant.contents().waterJoule(),
                plant.sumpKg(),
                plant.sumpJoule(),
                plant.metal().joule(),
                plant.loads().stream().mapToDouble(Body::joule).sum(),
                plant.ledger());
    }
}

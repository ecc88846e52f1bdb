package simulation;

import java.util.LinkedHashMap;
import java.util.Map;
import simulation.plant.Plant;

/** How far the books of a run fail to close, relative to all that the chamber held or took. */
public record Balance(double energy, double water, double air) {

    /** Reads the plant before the run. */
    static Before before(Plant plant) {
        return new Before(plant.joule(), plant.waterKg(), plant.contents().airKg());
    }

    Map<String, Object> asMap() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("energy-closes", energy < 1e-6);
        map.put("water-closes", water < 1e-6);
        map.put("air-closes", air < 1e-6);
        return map;
    }

    /** What the chamber held at the start. */
    record Before(double joule, double water, double air) {

        Balance after(Plant plant) {
            return new Balance(
                    miss(plant.joule() - joule, plant.joulesCrossed(), joule),
                    miss(plant.waterKg() - water, plant.waterCrossed(), water),
                    miss(plant.contents().airKg() - air, plant.airCrossed(), air));
        }

        private static double miss(double held, double crossed, double size) {
            return Math.abs(held - crossed) / Math.max(Math.max(Math.abs(held), Math.abs(crossed)), Math.abs(size));
        }
    }
}

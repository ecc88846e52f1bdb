package simulation.plant;

import java.util.List;

/** A place in the gas. Its air follows the chamber's by a lag of its own, and a pocket may sit there for a while. */
public final class GasSpot implements Spot {

    private static final double DRY_KELVIN = 5;
    private static final double LEAST_PASCAL = 2000;

    private final double mixingSeconds;
    private final List<Pocket> pockets;
    private double airShare = Double.NaN;
    private double celsius;
    private double depression;

    /** Describes the place. */
    public GasSpot(double mixingSeconds, List<Pocket> pockets) {
        this.mixingSeconds = mixingSeconds;
        this.pockets = List.copyOf(pockets);
    }

    @Override
    public void see(Plant plant) {
        GasState gas = plant.gas();
        if (Double.isNaN(airShare)) {
            airShare = gas.airShare();
        }
        airShare += (gas.airShare() - airShare) * Math.min(1, plant.seconds() / mixingSeconds);
        airShare = Math.max(airShare, gas.airShare());
        double share = airShare;
        for (Pocket pocket : pockets) {
            if (pocket.when().isOpen(plant.timeline())) {
                share = Math.max(share, gas.airShare() + pocket.shareNow(plant.timeline()));
            }
        }
        depression = depression(plant, gas, share);
        celsius = Math.max(
                gas.celsius() - depression, Math.min(gas.celsius(), plant.room().celsius()));
    }

    /** How far the dew point lies lower here than in the chamber; in gas far from its dew point it means nothing. */
    private static double depression(Plant plant, GasState gas, double share) {
        double dry = (gas.celsius() - gas.dewCelsius()) / DRY_KELVIN;
        if (share <= gas.airShare() + 1e-9 || gas.steamPascal() < LEAST_PASCAL || dry >= 1) {
            return 0;
        }
        double steam = Math.max(gas.steamPascal() * (1 - share) / (1 - gas.airShare()), LEAST_PASCAL);
        return (gas.dewCelsius() - plant.water().celsius(steam)) * (1 - dry);
    }

    double depression() {
        return depression;
    }

    @Override
    public double celsius() {
        return celsius;
    }
}

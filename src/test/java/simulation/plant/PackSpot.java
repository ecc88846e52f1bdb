package simulation.plant;

import java.util.List;

/** The middle of a pack of the load: air may keep the steam out of it. */
public final class PackSpot implements Spot {

    private final Body body;
    private final GasSpot gas;

    /** Names the body and the air in it. */
    public PackSpot(Body body, List<Pocket> pockets) {
        this.body = body;
        this.gas = new GasSpot(1e-3, pockets);
    }

    @Override
    public void see(Plant plant) {
        gas.see(plant);
    }

    @Override
    public double celsius() {
        return body.core() - gas.depression();
    }
}

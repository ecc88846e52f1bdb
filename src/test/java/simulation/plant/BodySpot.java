package simulation.plant;

/** The middle of a piece of the load, or the metal. */
public final class BodySpot implements Spot {

    private final Body body;

    /** Names the body. */
    public BodySpot(Body body) {
        this.body = body;
    }

    @Override
    public void see(Plant plant) {
        // The body knows its temperature.
    }

    @Override
    public double celsius() {
        return body.core();
    }
}

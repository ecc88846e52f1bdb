package simulation.plant;

import java.util.EnumMap;

/** Running sums of all that crosses a boundary. */
public final class Ledger {

    private final EnumMap<Flow, Double> sums;

    Ledger() {
        this(new EnumMap<>(Flow.class));
    }

    private Ledger(EnumMap<Flow, Double> sums) {
        this.sums = sums;
    }

    void add(Flow flow, double amount) {
        if (amount != 0) {
            sums.merge(flow, amount, Double::sum);
        }
    }

    /** Sum of one flow. */
    public double of(Flow flow) {
        return sums.getOrDefault(flow, 0.0);
    }

    Ledger copy() {
        return new Ledger(sums.clone());
    }
}

package simulation;

/** A run with all that a user would have of it, and the truth. */
public final class SimulatedRun {

    private final String name;
    private final String extension;
    private final byte[] log;
    private final String plan;
    private final String sheet;
    private final Truth truth;

    SimulatedRun(String name, String extension, byte[] log, String plan, String sheet, Truth truth) {
        this.name = name;
        this.extension = extension;
        this.log = log.clone();
        this.plan = plan;
        this.sheet = sheet;
        this.truth = truth;
    }

    /** Its name. */
    public String name() {
        return name;
    }

    /** Extension of the log, with its dot. */
    public String extension() {
        return extension;
    }

    /** The log as the logger wrote it. */
    public byte[] log() {
        return log.clone();
    }

    /** Text of the plan. */
    public String plan() {
        return plan;
    }

    /** Text of the run sheet. */
    public String sheet() {
        return sheet;
    }

    /** What really happened. */
    public Truth truth() {
        return truth;
    }
}

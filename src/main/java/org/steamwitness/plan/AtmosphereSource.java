package org.steamwitness.plan;

/** Where the pressure of the atmosphere comes from. */
public sealed interface AtmosphereSource {

    /**
     * The source in words, as a plan may write it.
     *
     * @return such as "entered" or "channel: barometer"
     */
    String words();

    /** The run sheet says it. */
    record Entered() implements AtmosphereSource {
        @Override
        public String words() {
            return "entered";
        }
    }

    /**
     * A channel of the log measures it.
     *
     * @param name channel of the plan
     */
    record Measured(String name) implements AtmosphereSource {
        @Override
        public String words() {
            return "channel: " + name;
        }
    }

    /**
     * It is estimated from the altitude.
     *
     * @param metre above sea level
     * @param written as the plan writes it
     */
    record Altitude(double metre, String written) implements AtmosphereSource {
        @Override
        public String words() {
            return "altitude: " + written;
        }
    }
}

package org.steamwitness.plan;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/**
 * A channel as the plan describes it.
 *
 * @param rule name, column, quantity, unit and datum
 * @param place where its sensor sits
 * @param contact what touches the sensor
 * @param uncertainty what the plan states of its uncertainty
 * @param lag what the plan states of the sensor's lag
 * @param certificate the calibration certificate
 * @param required whether a log without it can't be evaluated
 * @param corrections what its calibration adds, by rising reading
 * @param due when the next calibration is due
 */
public record PlannedChannel(
        ColumnRule rule,
        Place place,
        Contact contact,
        Optional<StatedUncertainty> uncertainty,
        Optional<Lag> lag,
        Optional<String> certificate,
        boolean required,
        List<SensorCorrection> corrections,
        Optional<LocalDate> due) {

    /**
     * Checks the corrections.
     *
     * @param rule name, column, quantity, unit and datum
     * @param place where its sensor sits
     * @param contact what touches the sensor
     * @param uncertainty what the plan states of its uncertainty
     * @param lag what the plan states of the sensor's lag
     * @param certificate the calibration certificate
     * @param required whether a log without it can't be evaluated
     * @param corrections what its calibration adds
     * @param due when the next calibration is due
     * @throws IllegalArgumentException if the corrections do not rise
     */
    public PlannedChannel {
        for (int i = 1; i < corrections.size(); i++) {
            if (!(corrections.get(i).at() > corrections.get(i - 1).at())) {
                throw new IllegalArgumentException("the corrections must stand in rising order of at");
            }
        }
        corrections = List.copyOf(corrections);
    }

    /**
     * The channel's name in plan and record.
     *
     * @return such as "can-1"
     */
    public String name() {
        return rule.channel();
    }

    /**
     * Tells whether this is a quantity of which a plan states the uncertainty.
     *
     * @return true for temperatures and pressures, which alone are held against limits with it
     */
    public boolean mayStateUncertainty() {
        return rule.kind() == QuantityKind.TEMPERATURE || rule.kind() == QuantityKind.PRESSURE;
    }

    /**
     * What a plan states of the part of a channel's uncertainty that all its samples share.
     *
     * @param calibration expanded uncertainty of the calibration, in kelvin or pascal
     * @param drift expanded allowance for drift since, in kelvin or pascal
     * @param shared the expanded part of the calibration's uncertainty that is the same error in all channels that state
     *     it, such as that of the thermometer they were all calibrated against; it cancels between them
     * @param coverage the factor by which all were expanded
     */
    public record StatedUncertainty(double calibration, double drift, double shared, double coverage) {

        /**
         * Checks the parts.
         *
         * @param calibration expanded uncertainty of the calibration
         * @param drift expanded allowance for drift since
         * @param shared the part of the calibration's uncertainty that channels share
         * @param coverage the factor by which all were expanded
         * @throws IllegalArgumentException if a part is below zero, or the shared one exceeds the calibration's
         */
        public StatedUncertainty {
            if (!(calibration >= 0 && drift >= 0 && shared >= 0)) {
                throw new IllegalArgumentException("an uncertainty is zero or more");
            }
            if (shared > calibration) {
                throw new IllegalArgumentException("shared is a part of calibration and may not exceed it");
            }
        }

        /**
         * The standard uncertainty that all samples share.
         *
         * @return in kelvin or pascal
         */
        public double standard() {
            return Math.sqrt(calibration * calibration + drift * drift) / coverage;
        }

        /**
         * The standard uncertainty that all channels that state it share.
         *
         * @return in kelvin or pascal, zero if none is stated
         */
        public double sharedStandard() {
            return shared / coverage;
        }
    }

    /**
     * The lag of a sensor that follows with one time constant.
     *
     * @param seconds the time constant, zero or more
     * @param uncertaintySeconds its standard uncertainty, zero or more
     */
    public record Lag(double seconds, double uncertaintySeconds) {

        /** No lag is stated. */
        public static final Lag NONE = new Lag(0, 0);
    }
}

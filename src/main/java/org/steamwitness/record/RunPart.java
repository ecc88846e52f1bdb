package org.steamwitness.record;

import java.util.List;

/**
 * What people entered by hand.
 *
 * @param enteredByHand always true: nothing here was measured by the log
 * @param run number of the run
 * @param planUsed plan and revision that the run sheet names
 * @param equipment the chamber
 * @param zone time zone of the log's clock
 * @param atmosphereKilopascal absolute pressure of the atmosphere
 * @param product what was processed
 * @param initialTemperature of the coldest container
 * @param marks instants, as times of day by the log's clock
 * @param entered who entered it and when
 */
public record RunPart(
        boolean enteredByHand,
        String run,
        PlanUsed planUsed,
        String equipment,
        Given<String> zone,
        Given<Double> atmosphereKilopascal,
        Given<Product> product,
        Given<InitialTemperature> initialTemperature,
        Marks marks,
        Entered entered) {

    /**
     * The plan that the run sheet names.
     *
     * @param id its id
     * @param revision its revision
     */
    public record PlanUsed(String id, int revision) {}

    /**
     * What was processed.
     *
     * @param name in words
     * @param code the plant's code
     * @param lots lot numbers
     * @param container kind and size of the container
     * @param count how many containers
     */
    public record Product(
            String name, Given<String> code, Given<List<String>> lots, Given<String> container, Given<Integer> count) {}

    /**
     * Temperature of the coldest container at the start.
     *
     * @param valueCelsius the temperature
     * @param at time of day
     * @param instrument with which instrument
     */
    public record InitialTemperature(double valueCelsius, Given<String> at, Given<String> instrument) {}

    /**
     * Instants entered by hand.
     *
     * @param steamOn steam let in
     * @param ventClosed vents closed
     * @param steamOff steam shut off
     */
    public record Marks(Given<String> steamOn, Given<String> ventClosed, Given<String> steamOff) {}

    /**
     * Who entered the run sheet.
     *
     * @param by name or function
     * @param at date and time, as written
     */
    public record Entered(String by, String at) {}
}

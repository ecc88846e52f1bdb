package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What people saw and did in one run, entered by hand. Nothing in it is measured by the log.
 *
 * @param run the run's own number
 * @param planId id of the plan that was used
 * @param planRevision its revision
 * @param equipment the chamber that was used
 * @param logPart the part of the log that holds the run
 * @param zone time zone of the log's clock, such as "Europe/Lisbon"; not yet resolved
 * @param clocks the log's clock against a trusted one
 * @param atmospherePascal absolute pressure of the atmosphere, as read beside the chamber
 * @param product what was processed
 * @param initialTemperature of the coldest container when steam came on
 * @param water water weighed before and after
 * @param marks instants that were noted
 * @param readings readings of the indicating instruments
 * @param probes where probes were put
 * @param indicators indicators that were read
 * @param corrections what a person corrected
 * @param events what happened
 * @param entered who entered all this and when
 */
public record RunSheet(
        String run,
        String planId,
        int planRevision,
        String equipment,
        Optional<LogPart> logPart,
        Optional<String> zone,
        Optional<EnteredClocks> clocks,
        Optional<Double> atmospherePascal,
        Optional<Product> product,
        Optional<InitialTemperature> initialTemperature,
        Optional<WeighedWater> water,
        EnteredMarks marks,
        List<HandReading> readings,
        List<PlacedProbe> probes,
        List<Indicator> indicators,
        List<Correction> corrections,
        List<RunEvent> events,
        Entered entered) {

    /** The entries that a plan may require, as it names them. */
    static final Set<String> ENTRIES = new LinkedHashSet<>(List.of(
            "zone",
            "atmosphere",
            "product",
            "lots",
            "initial-temperature",
            "marks.steam-on",
            "marks.vent-closed",
            "marks.timing-started",
            "marks.steam-off",
            "water",
            "clocks",
            "probes",
            "readings",
            "indicators"));

    /**
     * Reads a run sheet.
     *
     * @param file base name of the file, for messages
     * @param bytes the file as it is
     * @return the run sheet, or all that is wrong with it
     */
    public static AsWritten<RunSheet> read(String file, byte[] bytes) {
        return Document.read(file, bytes, RunSheetReader::runSheet);
    }

    /**
     * When steam was let in.
     *
     * @return by the log's clock
     */
    public Optional<LocalTime> steamOn() {
        return EnteredMarks.time(marks.steamOn());
    }

    /**
     * When the vents were closed.
     *
     * @return by the log's clock
     */
    public Optional<LocalTime> ventClosed() {
        return EnteredMarks.time(marks.ventClosed());
    }

    /**
     * When steam was shut off.
     *
     * @return by the log's clock
     */
    public Optional<LocalTime> steamOff() {
        return EnteredMarks.time(marks.steamOff());
    }

    /**
     * Tells whether an entry was made.
     *
     * @param entry as a plan names it under {@code run-sheet.required}
     * @return true if it was
     */
    public boolean holds(String entry) {
        return switch (entry) {
            case "zone" -> zone.isPresent();
            case "atmosphere" -> atmospherePascal.isPresent();
            case "product" -> product.isPresent();
            case "lots" -> product.isPresent() && !product.get().lots().isEmpty();
            case "initial-temperature" -> initialTemperature.isPresent();
            case "marks.steam-on" -> steamOn().isPresent();
            case "marks.vent-closed" -> ventClosed().isPresent();
            case "marks.timing-started" -> marks.timingStarted().isPresent();
            case "marks.steam-off" -> steamOff().isPresent();
            case "water" -> water.isPresent();
            case "clocks" -> clocks.isPresent();
            case "probes" -> !probes.isEmpty();
            case "readings" -> !readings.isEmpty();
            case "indicators" -> !indicators.isEmpty();
            default -> throw new IllegalArgumentException("no run sheet entry: " + entry);
        };
    }

    /**
     * What was processed.
     *
     * @param name in words
     * @param code the plant's own code
     * @param lots lot numbers
     * @param container kind and size of the container
     * @param count how many containers
     */
    public record Product(
            String name,
            Optional<String> code,
            List<String> lots,
            Optional<String> container,
            Optional<Integer> count) {}

    /**
     * Temperature of the coldest container at the start.
     *
     * @param kelvin the temperature
     * @param at when it was read
     * @param instrument with which instrument
     */
    public record InitialTemperature(double kelvin, Optional<LocalTime> at, Optional<String> instrument) {}

    /**
     * Who entered the run sheet.
     *
     * @param by name or function
     * @param at date and time, as written
     */
    public record Entered(String by, String at) {}
}

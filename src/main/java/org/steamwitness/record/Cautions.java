package org.steamwitness.record;

import java.util.List;
import java.util.stream.Stream;
import org.steamwitness.record.CycleRecord.Caution;

/** The usual cautions of food safety and pressure equipment. Each defers to local rules and qualified people. */
final class Cautions {

    private Cautions() {}

    static List<Caution> all() {
        return Stream.of(
                        "This record documents one run. It supports the review by qualified people under the local"
                                + " regulations and the scheduled process; it does not replace it, and it decides"
                                + " nothing about the safety of a product.",
                        "Low-acid food that was processed too little can carry botulinum toxin. Schedules come from a"
                                + " recognised process authority; a deviation is held until such a person decides. Never"
                                + " derive or shorten a schedule from this record.",
                        "Pressure equipment can burst or throw its door. Follow the maker's instructions and the local"
                                + " law on pressure equipment; inspection, relief valves, interlocks and repairs are for"
                                + " licensed people. This program is no safety system.",
                        "Steam and hot liquids scald, and sealed containers of hot liquid can burst minutes after the"
                                + " cycle. Wait for zero pressure and for the load temperature that the procedure names.",
                        "Gauge pressures depend on the atmosphere and so on altitude and weather; the absolute pressures"
                                + " here stand on the atmosphere that was entered.")
                .map(Caution::new)
                .toList();
    }
}

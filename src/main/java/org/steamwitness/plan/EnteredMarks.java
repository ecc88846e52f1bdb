package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.Optional;

/**
 * The instants that people noted in a run.
 *
 * @param steamOn steam let in
 * @param ventClosed vents closed
 * @param timingStarted the process timer started
 * @param steamOff steam shut off
 */
public record EnteredMarks(
        Optional<EnteredMark> steamOn,
        Optional<EnteredMark> ventClosed,
        Optional<EnteredMark> timingStarted,
        Optional<EnteredMark> steamOff) {

    /** Nothing was noted. */
    public static final EnteredMarks NONE =
            new EnteredMarks(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());

    static Optional<LocalTime> time(Optional<EnteredMark> mark) {
        return mark.map(EnteredMark::at);
    }
}

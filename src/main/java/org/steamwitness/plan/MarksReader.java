package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.Optional;
import org.steamwitness.quantity.QuantityText;

/** Understands {@code marks} of a run sheet. */
final class MarksReader {

    static final String A_TIME = "a time of day such as 08:12 or 08:12:30";

    private MarksReader() {}

    static EnteredMarks marks(Section at) {
        Entry<EnteredMark> steamOn = mark(at.may("steam-on"));
        Entry<EnteredMark> ventClosed = mark(at.may("vent-closed"));
        Entry<EnteredMark> timingStarted = mark(at.may("timing-started"));
        Entry<EnteredMark> steamOff = mark(at.may("steam-off"));
        return new EnteredMarks(
                steamOn.optional(), ventClosed.optional(), timingStarted.optional(), steamOff.optional());
    }

    static Entry<LocalTime> time(Slot slot) {
        return slot.parsed(A_TIME, LocalTime::parse);
    }

    private static Entry<EnteredMark> mark(Slot slot) {
        return slot.isSection()
                ? slot.section(MarksReader::withIndication)
                : slot.parsed(A_TIME, text -> new EnteredMark(LocalTime.parse(text), Optional.empty()));
    }

    private static EnteredMark withIndication(Section at) {
        Entry<LocalTime> time = time(at.need("at"));
        Entry<Double> indicating = indicating(at);
        return new EnteredMark(time.get(), indicating.optional());
    }

    static Entry<Double> indicating(Section at) {
        return at.may("indicating").parsed("a temperature such as 107.8 degC", QuantityText::kelvin);
    }
}

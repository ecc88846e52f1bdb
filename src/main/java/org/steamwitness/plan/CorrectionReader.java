package org.steamwitness.plan;

import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;

/** Understands one entry of {@code corrections} of a run sheet. */
final class CorrectionReader {

    private CorrectionReader() {}

    static Correction correction(Section at) {
        Entry<String> reason = at.need("reason").text();
        Entry<String> by = at.need("by").text();
        Entry<String> written = instant(at.need("at"));
        if (at.has("channel")) {
            Entry<String> channel = at.need("channel").text();
            return new Correction.ExcludedProbe(channel.get(), reason.get(), by.get(), written.get());
        }
        Entry<PlannedPhase> phase = at.need("phase").word(PlannedPhase.class, PlannedPhase::word);
        Entry<LocalTime> starts = MarksReader.time(at.may("starts"));
        Entry<LocalTime> ends = MarksReader.time(at.may("ends"));
        if (at.has("starts") == at.has("ends")) {
            throw new IllegalArgumentException("a moved boundary needs either starts or ends");
        }
        boolean start = at.has("starts");
        LocalTime to = start ? starts.get() : ends.get();
        return new Correction.MovedBoundary(phase.get(), start, to, reason.get(), by.get(), written.get());
    }

    /** A date and time with its distance from UTC, kept as written. */
    static Entry<String> instant(Slot slot) {
        return slot.parsed("a time such as 2026-03-14T10:31+00:00", text -> {
            DateTimeFormatter.ISO_OFFSET_DATE_TIME.parse(text, OffsetDateTime::from);
            return text;
        });
    }
}

package org.steamwitness.plan;

import java.time.LocalTime;
import org.steamwitness.quantity.PressureReading;
import org.steamwitness.quantity.QuantityText;

/** Understands one entry of {@code readings}. */
final class HandReadingReader {

    private HandReadingReader() {}

    static HandReading reading(Section at) {
        Entry<LocalTime> time = MarksReader.time(at.need("at"));
        Entry<Double> indicating = MarksReader.indicating(at);
        Entry<PressureReading> pressure =
                at.may("pressure").parsed("a pressure such as 1.07 bar(g)", QuantityText::pressure);
        return new HandReading(time.get(), indicating.optional(), pressure.optional());
    }
}

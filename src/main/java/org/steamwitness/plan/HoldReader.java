package org.steamwitness.plan;

import java.util.List;
import org.steamwitness.quantity.QuantityText;

/** Understands {@code hold}. */
final class HoldReader {

    private HoldReader() {}

    static Hold hold(Section at) {
        Entry<Double> atLeast = at.need("at-least").parsed("a temperature such as 121.1 degC", QuantityText::kelvin);
        Entry<Double> atMost = at.need("at-most").parsed("a temperature such as 124.1 degC", QuantityText::kelvin);
        Entry<Double> setPoint = at.may("set-point").parsed("a temperature such as 122.0 degC", QuantityText::kelvin);
        Entry<Double> duration = at.need("duration").parsed("a duration such as 42 min", QuantityText::seconds);
        Entry<List<String>> starts = at.need("starts").section(HoldReader::starts);
        return new Hold(atLeast.get(), atMost.get(), setPoint.optional(), duration.get(), starts.get());
    }

    private static List<String> starts(Section at) {
        Entry<String> when = at.need("when").parsed("one of: all", HoldReader::all);
        Entry<List<String>> channels = at.need("channels").list(Slot::text);
        when.get();
        return channels.get();
    }

    private static String all(String text) {
        if (!text.equals("all")) {
            throw new IllegalArgumentException("\"" + text + "\" is not one of: all");
        }
        return text;
    }
}

package org.steamwitness.plan;

import org.steamwitness.quantity.AmountText;

/** Understands {@code atmosphere} of a plan: a word, or a channel or an altitude as text or one level deeper. */
final class AtmosphereReader {

    private static final String EXPECTED = "one of: entered, channel: NAME, altitude: 350 m";
    private static final String CHANNEL = "channel: ";
    private static final String ALTITUDE = "altitude: ";

    private AtmosphereReader() {}

    static Entry<AtmosphereSource> source(Slot slot) {
        return slot.isSection()
                ? slot.section(AtmosphereReader::keyed)
                : slot.parsed(EXPECTED, AtmosphereReader::written);
    }

    private static AtmosphereSource keyed(Section at) {
        Entry<String> channel = at.may("channel").text();
        Entry<AtmosphereSource> altitude =
                at.may("altitude").parsed("an altitude such as 350 m", AtmosphereReader::altitude);
        if (at.has("channel") == at.has("altitude")) {
            throw new IllegalArgumentException("expected either channel or altitude");
        }
        return at.has("channel") ? new AtmosphereSource.Measured(channel.get()) : altitude.get();
    }

    private static AtmosphereSource written(String text) {
        if (text.equals("entered")) {
            return new AtmosphereSource.Entered();
        }
        if (text.startsWith(CHANNEL) && text.length() > CHANNEL.length()) {
            return new AtmosphereSource.Measured(text.substring(CHANNEL.length()));
        }
        if (text.startsWith(ALTITUDE)) {
            return altitude(text.substring(ALTITUDE.length()));
        }
        throw new IllegalArgumentException("\"" + text + "\" is not " + EXPECTED);
    }

    private static AtmosphereSource altitude(String text) {
        return new AtmosphereSource.Altitude(AmountText.altitudeMetre(text), text);
    }
}

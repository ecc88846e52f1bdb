package org.steamwitness.chart;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The program's own fonts, so that a picture looks the same on every machine. */
public final class ChartFonts {

    /** Family name under which the regular font draws. */
    public static final String FAMILY = "IBM Plex Sans";

    /** Resource of the regular font. */
    public static final String REGULAR = "/org/steamwitness/fonts/IBMPlexSans_400Regular.ttf";

    private final Font regular;

    private ChartFonts(Font regular) {
        this.regular = regular;
    }

    /**
     * Loads the fonts from the program itself.
     *
     * @return the fonts
     * @throws UncheckedIOException if the program is not whole
     */
    public static ChartFonts load() {
        try (InputStream file = ChartFonts.class.getResourceAsStream(REGULAR)) {
            return new ChartFonts(Font.createFont(Font.TRUETYPE_FONT, file));
        } catch (IOException | FontFormatException damaged) {
            throw new UncheckedIOException(new IOException("the program's fonts cannot be read", damaged));
        }
    }

    /**
     * The regular font in one size.
     *
     * @param points its size
     * @return the font
     */
    public Font regular(float points) {
        return regular.deriveFont(points);
    }
}

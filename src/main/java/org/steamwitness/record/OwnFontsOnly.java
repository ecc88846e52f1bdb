package org.steamwitness.record;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.fontbox.FontBoxFont;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.font.CIDFontMapping;
import org.apache.pdfbox.pdmodel.font.FontMapper;
import org.apache.pdfbox.pdmodel.font.FontMapping;
import org.apache.pdfbox.pdmodel.font.PDCIDSystemInfo;
import org.apache.pdfbox.pdmodel.font.PDFontDescriptor;
import org.steamwitness.chart.ChartFonts;

/**
 * Answers every request for a font of the machine with the program's own, so that a record looks the same everywhere
 * and no folder of the machine is searched or written to.
 */
final class OwnFontsOnly implements FontMapper {

    @Override
    public FontMapping<TrueTypeFont> getTrueTypeFont(String baseFont, PDFontDescriptor descriptor) {
        return new FontMapping<>(regular(), false);
    }

    @Override
    public FontMapping<FontBoxFont> getFontBoxFont(String baseFont, PDFontDescriptor descriptor) {
        return new FontMapping<>(regular(), false);
    }

    @Override
    public CIDFontMapping getCIDFont(String baseFont, PDFontDescriptor descriptor, PDCIDSystemInfo system) {
        return new CIDFontMapping(null, regular(), false);
    }

    private static TrueTypeFont regular() {
        try {
            return new TTFParser()
                    .parse(RandomAccessReadBuffer.createBufferFromStream(
                            OwnFontsOnly.class.getResourceAsStream(ChartFonts.REGULAR)));
        } catch (IOException damaged) {
            throw new UncheckedIOException("the program's fonts cannot be read", damaged);
        }
    }
}

package org.steamwitness.record;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Collectors;

/** Which characters of a record none of the program's fonts can print. */
final class PrintableCharacters {

    private static final List<String> FONTS = List.of("IBMPlexSans_400Regular.ttf", "DejaVuSans.ttf");
    private static final int FIRST_BEYOND_ASCII = 0x80;

    private PrintableCharacters() {}

    /** The characters, each once, separated by spaces, as U+ and four digits or more. */
    static String missingFrom(CycleRecord record) {
        int[] unusual = new String(RecordJson.write(record), StandardCharsets.UTF_8)
                .codePoints()
                .filter(c -> c >= FIRST_BEYOND_ASCII)
                .distinct()
                .sorted()
                .toArray();
        if (unusual.length == 0) {
            return "";
        }
        List<Font> fonts = FONTS.stream().map(PrintableCharacters::font).toList();
        return Arrays.stream(unusual)
                .filter(c -> fonts.stream().noneMatch(font -> font.canDisplay(c)))
                .mapToObj(PrintableCharacters::named)
                .collect(Collectors.joining(" "));
    }

    private static String named(int character) {
        String digits = HexFormat.of().withUpperCase().toHexDigits(character, 6);
        return "U+" + (digits.startsWith("00") ? digits.substring(2) : digits);
    }

    private static Font font(String name) {
        try (InputStream file = PrintableCharacters.class.getResourceAsStream("/org/steamwitness/fonts/" + name)) {
            return Font.createFont(Font.TRUETYPE_FONT, file);
        } catch (IOException | FontFormatException damaged) {
            throw new UncheckedIOException(new IOException("the program's fonts cannot be read", damaged));
        }
    }
}

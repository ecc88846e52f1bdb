package org.steamwitness.intake;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;

/**
 * The first lines of a log, from which its form is found.
 *
 * @param lines as an editor shows them, the first being line 1
 * @param whole whether these are all lines of the log
 */
record LineSample(List<String> lines, boolean whole) {

    private static final int MOST_LINES = 600;
    private static final int MOST_CHARACTERS = 4_000_000;

    static LineSample of(LogText text) {
        List<String> lines = new ArrayList<>();
        int characters = 0;
        try (BufferedReader reader = new BufferedReader(text.capped(false))) {
            String line = reader.readLine();
            while (line != null && lines.size() < MOST_LINES && characters < MOST_CHARACTERS) {
                lines.add(line);
                characters += line.length();
                line = reader.readLine();
            }
            return new LineSample(lines, line == null);
        } catch (IOException impossibleInMemory) {
            throw new UncheckedIOException(impossibleInMemory);
        }
    }
}

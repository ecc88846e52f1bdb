package org.steamwitness.intake;

import java.io.IOException;
import java.io.Reader;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

/**
 * Text with a cap on the length of its lines: what goes beyond is dropped and the line is remembered, so that a line
 * without end is one refused row and no flood. Lines end as an editor ends them: LF, CR LF or CR. Runs of spaces can be
 * made one tabulator, for logs that are delimited so.
 */
final class CappedLines extends Reader {

    /** Longer lines are refused; the widest sensible log of ten thousand columns stays far below. */
    static final int LONGEST = 1_000_000;

    private final Reader text;
    private final boolean joinSpaces;
    private final List<Integer> cut = new CopyOnWriteArrayList<>();
    private int line = 1;
    private int length;
    private boolean afterReturn;
    private boolean afterSpace = true;

    CappedLines(Reader text, boolean joinSpaces) {
        this.text = text;
        this.joinSpaces = joinSpaces;
    }

    /** Numbers of the lines that were cut, in order; may be asked by another thread. */
    List<Integer> cut() {
        return cut;
    }

    @Override
    public int read(char[] buffer, int offset, int wanted) throws IOException {
        int kept = 0;
        while (kept == 0) {
            int got = text.read(buffer, offset, wanted);
            if (got <= 0) {
                return got;
            }
            kept = joinSpaces ? joined(buffer, offset, got) : capped(buffer, offset, got);
        }
        return kept;
    }

    /** Lines are short as a rule: then nothing is dropped and the buffer stays as it was read. */
    private int capped(char[] buffer, int offset, int got) {
        int end = offset + got;
        int start = offset;
        for (int i = offset; i < end; i++) {
            char c = buffer[i];
            if (c <= '\r' && (c == '\n' || c == '\r')) {
                if (length + i - start > LONGEST) {
                    return dropped(buffer, offset, start, end);
                }
                afterReturn = afterReturn && i == start;
                ends(c);
                start = i + 1;
            }
        }
        if (length + end - start > LONGEST) {
            return dropped(buffer, offset, start, end);
        }
        afterReturn = afterReturn && start == end;
        length += end - start;
        return got;
    }

    /** The same for a stretch that holds a line too long, from where that line goes on. */
    private int dropped(char[] buffer, int offset, int from, int end) {
        int kept = from - offset;
        for (int i = from; i < end; i++) {
            char c = buffer[i];
            if (c == '\n' || c == '\r') {
                ends(c);
                buffer[offset + kept++] = c;
            } else if (++length <= LONGEST) {
                afterReturn = false;
                buffer[offset + kept++] = c;
            } else if (length == LONGEST + 1) {
                cut.add(line);
            }
        }
        return kept;
    }

    private int joined(char[] buffer, int offset, int got) {
        int kept = 0;
        int whole = capped(buffer, offset, got);
        for (int i = offset; i < offset + whole; i++) {
            char c = buffer[i];
            boolean space = c == ' ';
            if (!space || !afterSpace) {
                buffer[offset + kept++] = space ? '\t' : c;
            }
            afterSpace = space || c == '\n' || c == '\r';
        }
        return kept;
    }

    private void ends(char c) {
        if (!(c == '\n' && afterReturn)) {
            line++;
        }
        afterReturn = c == '\r';
        length = 0;
    }

    @Override
    public void close() throws IOException {
        text.close();
    }
}

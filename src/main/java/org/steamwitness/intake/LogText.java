package org.steamwitness.intake;

import java.io.ByteArrayInputStream;
import java.io.InputStreamReader;
import java.nio.charset.CodingErrorAction;

/** A log's bytes, decoded anew on each walk so that the text is never held whole. */
final class LogText {

    private final byte[] bytes;
    private final Encoding encoding;

    /**
     * Takes the bytes as they are, without a copy: a log may be large, and nobody changes it while it is read.
     *
     * @param bytes the log
     * @param encoding of its bytes
     */
    LogText(byte[] bytes, Encoding encoding) {
        this.bytes = bytes;
        this.encoding = encoding;
    }

    Encoding encoding() {
        return encoding;
    }

    int length() {
        return bytes.length;
    }

    /**
     * The text with capped lines, in which U+FFFD stands for bytes that the encoding does not know; with runs of spaces
     * made one tabulator if they delimit fields.
     */
    CappedLines capped(boolean joinSpaces) {
        return new CappedLines(
                new InputStreamReader(
                        new ByteArrayInputStream(bytes, encoding.skipped(), bytes.length - encoding.skipped()),
                        encoding.charset()
                                .newDecoder()
                                .onMalformedInput(CodingErrorAction.REPLACE)
                                .onUnmappableCharacter(CodingErrorAction.REPLACE)),
                joinSpaces);
    }
}

package org.steamwitness.intake;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/**
 * The character encoding of a log and how it came to be known.
 *
 * @param charset what decodes the bytes
 * @param name as the record tells it
 * @param skipped bytes of the mark at the start that are no text
 * @param evidence why it was taken, in words
 */
record Encoding(Charset charset, String name, int skipped, String evidence) {

    private static final Charset WINDOWS_1252 = Charset.forName("windows-1252");

    /** Beyond this share of control characters bytes are no text; common practice, no source. */
    private static final double LARGEST_CONTROL_SHARE = 0.02;

    private static final int LOOKED_AT = 65_536;

    /** What a log's bytes turn out to be. */
    sealed interface Found {

        /** An encoding that can be used. */
        record Known(Encoding encoding) implements Found {}

        /** Bytes that are no text. */
        record NoText(String why) implements Found {}

        /** Text whose encoding can't be told. */
        record Undecided(String why) implements Found {}
    }

    static Found of(byte[] bytes) {
        String kind = Magic.of(bytes);
        if (!kind.isEmpty()) {
            return new Found.NoText("it begins like " + kind);
        }
        if (starts(bytes, 0xEF, 0xBB, 0xBF)) {
            return known(StandardCharsets.UTF_8, "UTF-8 with byte order mark", 3, "its byte order mark");
        }
        if (starts(bytes, 0xFF, 0xFE)) {
            return known(StandardCharsets.UTF_16LE, "UTF-16LE", 2, "its byte order mark");
        }
        if (starts(bytes, 0xFE, 0xFF)) {
            return known(StandardCharsets.UTF_16BE, "UTF-16BE", 2, "its byte order mark");
        }
        return withoutMark(bytes);
    }

    private static Found withoutMark(byte[] bytes) {
        int looked = Math.min(LOOKED_AT, bytes.length) & ~1;
        int evenZeros = 0;
        int oddZeros = 0;
        int controls = 0;
        for (int i = 0; i < looked; i++) {
            evenZeros += bytes[i] == 0 && i % 2 == 0 ? 1 : 0;
            oddZeros += bytes[i] == 0 && i % 2 == 1 ? 1 : 0;
            controls +=
                    bytes[i] > 0 && bytes[i] < 32 && bytes[i] != '\t' && bytes[i] != '\n' && bytes[i] != '\r' ? 1 : 0;
        }
        if (looked > 0 && oddZeros > 0.4 * looked / 2 && evenZeros < oddZeros / 10) {
            return known(StandardCharsets.UTF_16LE, "UTF-16LE", 0, "every second byte is zero");
        }
        if (looked > 0 && evenZeros > 0.4 * looked / 2 && oddZeros < evenZeros / 10) {
            return known(StandardCharsets.UTF_16BE, "UTF-16BE", 0, "every second byte is zero");
        }
        if (controls > LARGEST_CONTROL_SHARE * looked) {
            return new Found.NoText("it holds control characters that no text has");
        }
        return byUtf8(bytes);
    }

    private static Found byUtf8(byte[] bytes) {
        Utf8 utf8 = Utf8.of(bytes);
        if (utf8.wrong == 0) {
            return known(StandardCharsets.UTF_8, "UTF-8", 0, "every byte fits");
        }
        if (utf8.sequences > 0) {
            return new Found.Undecided("some of its bytes are UTF-8 beyond ASCII and " + utf8.wrong
                    + " are not, the first at byte " + (utf8.firstWrong + 1));
        }
        return known(WINDOWS_1252, "windows-1252", 0, "bytes beyond ASCII that are no UTF-8");
    }

    private static Found known(Charset charset, String name, int skipped, String evidence) {
        return new Found.Known(new Encoding(charset, name, skipped, evidence));
    }

    private static boolean starts(byte[] bytes, int... first) {
        for (int i = 0; i < first.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != first[i]) {
                return false;
            }
        }
        return true;
    }

    /** How far bytes are UTF-8. A sequence that the end of the file cuts off is the last row's trouble. */
    private record Utf8(int sequences, int wrong, int firstWrong) {

        static Utf8 of(byte[] bytes) {
            if (ascii(bytes)) {
                return new Utf8(0, 0, -1);
            }
            CharsetDecoder decoder = StandardCharsets.UTF_8
                    .newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT);
            ByteBuffer in = ByteBuffer.wrap(bytes);
            CharBuffer out = CharBuffer.allocate(8192);
            int sequences = 0;
            int wrong = 0;
            int firstWrong = -1;
            boolean more = true;
            while (more) {
                CoderResult result = decoder.decode(in, out, false);
                out.flip();
                while (out.hasRemaining()) {
                    sequences += out.get() > 127 ? 1 : 0;
                }
                out.clear();
                if (result.isMalformed() || result.isUnmappable()) {
                    firstWrong = wrong == 0 ? in.position() : firstWrong;
                    wrong++;
                    in.position(in.position() + result.length());
                    decoder.reset();
                }
                more = !result.isUnderflow();
            }
            return new Utf8(sequences, wrong, firstWrong);
        }

        private static boolean ascii(byte[] bytes) {
            int any = 0;
            for (byte b : bytes) {
                any |= b;
            }
            return any >= 0;
        }
    }
}

package org.steamwitness.intake;

import java.nio.charset.StandardCharsets;
import java.util.List;

/** The first bytes of files that are no logs, whatever their name says; published by the formats' own standards. */
final class Magic {

    private static final List<Signature> KNOWN = List.of(
            new Signature("PK\u0003\u0004", "a ZIP archive or a spreadsheet; save it as text with delimiters"),
            new Signature("%PDF-", "a PDF document; export the samples as text with delimiters"),
            new Signature("\u00D0\u00CF\u0011\u00E0", "an old office document; save it as text with delimiters"),
            new Signature("\u001F\u008B", "a gzip archive; unpack it first"),
            new Signature("7z\u00BC\u00AF", "a 7z archive; unpack it first"),
            new Signature("\u0089PNG", "a picture"),
            new Signature("\u00FF\u00D8\u00FF", "a picture"),
            new Signature("SQLite format 3\u0000", "a database; export the samples as text with delimiters"));

    private Magic() {}

    /** What the bytes begin like, in words; empty if they may be a log. */
    static String of(byte[] bytes) {
        for (Signature signature : KNOWN) {
            if (signature.starts(bytes)) {
                return signature.words;
            }
        }
        return "";
    }

    private record Signature(String first, String words) {
        boolean starts(byte[] bytes) {
            byte[] wanted = first.getBytes(StandardCharsets.ISO_8859_1);
            for (int i = 0; i < wanted.length; i++) {
                if (i >= bytes.length || bytes[i] != wanted[i]) {
                    return false;
                }
            }
            return true;
        }
    }
}

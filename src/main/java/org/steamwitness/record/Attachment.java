package org.steamwitness.record;

/** A file that the PDF carries. */
public final class Attachment {

    private final String name;
    private final String mediaType;
    private final Relation relation;
    private final byte[] bytes;

    /**
     * Names a file to attach.
     *
     * @param name base name
     * @param mediaType such as "text/csv"
     * @param relation what it is to the printed page
     * @param bytes its content
     */
    public Attachment(String name, String mediaType, Relation relation, byte[] bytes) {
        this.name = name;
        this.mediaType = mediaType;
        this.relation = relation;
        this.bytes = bytes.clone();
    }

    String name() {
        return name;
    }

    String mediaType() {
        return mediaType;
    }

    Relation relation() {
        return relation;
    }

    byte[] bytes() {
        return bytes.clone();
    }

    /** What an attached file is to the document: ISO 19005-3:2012, AFRelationship (named from memory). */
    public enum Relation {
        /** The logger file, from which the page was made. */
        LOG("Source", "logger file"),
        /** The plan, from which the page was made. */
        PLAN("Source", "plan"),
        /** The run sheet, from which the page was made. */
        RUN_SHEET("Source", "run sheet"),
        /** The template, by which the page was made. */
        TEMPLATE("Source", "template of the printed record"),
        /** The page's data. */
        RECORD("Data", "record data");

        private final String pdfName;
        private final String words;

        Relation(String pdfName, String words) {
            this.pdfName = pdfName;
            this.words = words;
        }

        String pdfName() {
            return pdfName;
        }

        String words() {
            return words;
        }
    }
}

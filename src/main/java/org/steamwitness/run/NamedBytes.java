package org.steamwitness.run;

/** A file in memory. */
public final class NamedBytes {

    private final String name;
    private final byte[] bytes;

    /**
     * Takes a copy of the bytes.
     *
     * @param name base name of the file
     * @param bytes its content
     */
    public NamedBytes(String name, byte[] bytes) {
        this.name = name;
        this.bytes = bytes.clone();
    }

    /**
     * Base name of the file.
     *
     * @return without any folder
     */
    public String name() {
        return name;
    }

    byte[] bytes() {
        return bytes;
    }
}

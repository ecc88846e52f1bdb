package org.steamwitness.run;

/** What the program calls itself. */
public final class Program {

    /** Its name. */
    public static final String NAME = "Steamwitness";

    /** Its version, as in the build. */
    public static final String VERSION = "0.1.0";

    private Program() {}
}

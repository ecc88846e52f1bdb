package org.steamwitness.run;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Names for files that are being written: in the folder where they will lie, with the rights that files get there. */
final class Parts {

    private static final int MOST = 1000;

    private Parts() {}

    /** A new empty file that is gone when the program ends, unless it has been moved. */
    static Path in(Path folder) throws IOException {
        long mark = ProcessHandle.current().pid();
        for (int i = 0; i < MOST; i++) {
            Path file = folder.resolve(".steamwitness-" + mark + "-" + i + ".part");
            try {
                Files.createFile(file);
                file.toFile().deleteOnExit();
                return file;
            } catch (FileAlreadyExistsException taken) {
                // the next number
            }
        }
        throw new IOException("no free name for a file in " + folder);
    }
}

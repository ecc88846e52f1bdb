package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import org.steamwitness.finding.Finding;

/**
 * A plan or run sheet as it was written, or all that is wrong with it.
 *
 * @param <T> what was to be read
 * @param value the value, if nothing is wrong
 * @param problems what is wrong, in the order of the file
 */
public record AsWritten<T>(Optional<T> value, List<Finding> problems) {

    /**
     * Takes a copy of the problems.
     *
     * @param value the value, if nothing is wrong
     * @param problems what is wrong
     */
    public AsWritten {
        problems = List.copyOf(problems);
    }
}

package org.steamwitness.architecture;

import com.tngtech.archunit.lang.ArchRule;
import java.util.function.Function;

/**
 * A rule that can be held against any tree of packages laid out like the program.
 *
 * @param name the place of its fixture below {@code fixtures}, such as {@code house.clock}
 * @param from the rule for a given root package
 */
record Rule(String name, Function<String, ArchRule> from) {

    ArchRule on(String root) {
        return from.apply(root);
    }

    @Override
    public String toString() {
        return name;
    }
}

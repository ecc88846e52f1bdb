package org.steamwitness.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.lang.ArchRule;
import java.util.List;

/**
 * Keeps a library behind the packages that need it. Each pattern begins with two dots, so that it also matches a library
 * carried along under another root, and a stand-in in a fixture: {@code ..org.jdbi..} matches {@code org.jdbi.v3.core}
 * and {@code fixtures.fence.database.library.org.jdbi.v3.core} alike. That is how the fences round JavaFX, Jdbi, SQLite,
 * PostgreSQL and Bouncy Castle are tested without these libraries on the class path. No package of the program may
 * therefore be called {@code javafx} or the like.
 *
 * @param name what the library is for
 * @param library patterns of its packages
 * @param allowed the packages of the program, below the root, that may use it
 */
record Fence(String name, List<String> library, List<String> allowed) {

    static final List<Fence> ALL = List.of(
            new Fence("csv", List.of("..org.apache.commons.csv.."), List.of("intake")),
            new Fence("yaml", List.of("..org.snakeyaml..", "..org.yaml.."), List.of("plan")),
            new Fence("json", List.of("..tools.jackson..", "..com.fasterxml.jackson.."), List.of("plan", "record")),
            new Fence("mathematics", List.of("..org.hipparchus.."), List.of("evaluate", "compare")),
            new Fence("picture", List.of("..org.jfree.."), List.of("chart", "record")),
            new Fence("template", List.of("..com.github.mustachejava.."), List.of("record")),
            new Fence("page", List.of("..com.openhtmltopdf.."), List.of("record")),
            new Fence(
                    "pdf",
                    List.of(
                            "..org.apache.pdfbox..",
                            "..org.apache.fontbox..",
                            "..org.apache.xmpbox..",
                            "..de.rototor.pdfbox.."),
                    List.of("record")),
            new Fence("signature", List.of("..org.bouncycastle.."), List.of("record")),
            new Fence(
                    "database",
                    List.of("..org.jdbi..", "..org.sqlite..", "..org.postgresql..", "..java.sql..", "..javax.sql.."),
                    List.of("archive")),
            new Fence("arguments", List.of("..picocli.."), List.of("cli")),
            new Fence("window", List.of("..javafx.."), List.of("desk")));

    Rule rule() {
        return new Rule("fence." + name, this::on);
    }

    private ArchRule on(String root) {
        return noClasses()
                .that()
                .resideOutsideOfPackages(ArchitectureRules.below(root, allowed))
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(library.toArray(String[]::new))
                .as("only " + String.join(" and ", allowed) + " may use " + String.join(", ", library));
    }
}

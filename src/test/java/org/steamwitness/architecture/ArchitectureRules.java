package org.steamwitness.architecture;

import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** Every rule of the architecture, in terms of the root package it is held against. */
final class ArchitectureRules {

    /** What each package may see, itself aside. */
    private static final Map<String, List<String>> ARROWS = table("""
            quantity ->
            steam    ->
            trace    -> quantity
            finding  -> trace quantity
            plan     -> finding trace quantity
            evaluate -> steam plan finding trace quantity
            compare  -> evaluate plan finding trace quantity
            chart    -> compare evaluate plan finding trace quantity
            intake   -> finding trace quantity
            record   -> chart compare evaluate plan finding trace quantity
            archive  -> record chart compare evaluate plan finding trace quantity
            run      -> archive record intake chart compare evaluate plan finding trace quantity
            cli      -> run record finding quantity
            desk     -> run record chart evaluate plan finding trace quantity
            """);

    /** What each question of the evaluation may see of the others. Only the list of steps above them sees them all. */
    private static final Map<String, List<String>> QUESTIONS = table("""
            uncertainty ->
            instruments -> uncertainty
            phase       -> uncertainty instruments
            saturation  -> uncertainty instruments phase
            hold        -> uncertainty instruments phase
            lethality   -> uncertainty instruments phase
            energy      -> uncertainty instruments phase
            leak        -> uncertainty instruments phase
            criteria    -> uncertainty instruments phase saturation hold lethality energy leak
            """);

    private ArchitectureRules() {}

    /** Every rule; the name of each is also the place of its fixture. */
    static List<Rule> all() {
        return Stream.of(
                        Stream.of(
                                new Rule("arrows", ArchitectureRules::arrows),
                                new Rule("order", ArchitectureRules::orderOfEvaluation),
                                new Rule("cycles", ArchitectureRules::noCycles)),
                        Fence.ALL.stream().map(Fence::rule),
                        HouseRules.all().stream())
                .flatMap(rules -> rules)
                .toList();
    }

    /** Patterns of packages with all that lies below them. */
    static String[] below(String root, List<String> packages) {
        return packages.stream().map(name -> root + "." + name + "..").toArray(String[]::new);
    }

    /** A package depends only on what the arrows reach, and there is no package the design does not name. */
    private static ArchRule arrows(String root) {
        return layers(root, ARROWS)
                .ensureAllClassesAreContainedInArchitecture()
                .as("packages see only what the arrows reach");
    }

    /** Instruments, then phases, then the questions blind to each other, then the criteria. */
    private static ArchRule orderOfEvaluation(String root) {
        String evaluate = root + ".evaluate";
        return layers(evaluate, QUESTIONS)
                .layer("steps")
                .definedBy(evaluate)
                .whereLayer("steps")
                .mayNotBeAccessedByAnyLayer()
                .as("instruments come before phases, phases before the questions, the criteria last");
    }

    private static ArchRule noCycles(String root) {
        return slices().matching(root + ".(**)").should().beFreeOfCycles().as("no cycles between packages");
    }

    private static LayeredArchitecture layers(String root, Map<String, List<String>> maySee) {
        LayeredArchitecture layers = layeredArchitecture()
                .consideringOnlyDependenciesInAnyPackage(root + "..")
                .withOptionalLayers(true);
        for (String name : maySee.keySet()) {
            layers = layers.layer(name).definedBy(root + "." + name + "..");
        }
        for (Map.Entry<String, List<String>> entry : maySee.entrySet()) {
            String[] seen = entry.getValue().toArray(String[]::new);
            layers = seen.length == 0
                    ? layers.whereLayer(entry.getKey()).mayNotAccessAnyLayer()
                    : layers.whereLayer(entry.getKey()).mayOnlyAccessLayers(seen);
        }
        return layers;
    }

    private static Map<String, List<String>> table(String text) {
        Map<String, List<String>> table = new LinkedHashMap<>();
        text.lines().forEach(line -> {
            String[] sides = line.split(" *-> *", -1);
            table.put(sides[0], sides[1].isEmpty() ? List.of() : List.of(sides[1].split(" ", -1)));
        });
        return table;
    }
}

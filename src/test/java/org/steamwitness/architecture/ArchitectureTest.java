package org.steamwitness.architecture;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaMember;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ArchitectureTest {

    /** Classes of the program when somebody last looked, nested ones included. It may only rise. */
    private static final int LAST_COUNT = 360;

    private static final String ROOT = "org.steamwitness";
    private static final String FIXTURES = ROOT + ".architecture.fixtures";

    /** In a report a line names the offender first, with a capital: {@code Method <a.B.c()> calls method <x.Y.z()>}. */
    private static final Pattern OFFENDER = Pattern.compile("\\b[A-Z]\\w* <(.+?)>(?= )");

    private static final JavaClasses PROGRAM = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages(ROOT);

    private static final JavaClasses FIXTURE_CLASSES = new ClassFileImporter().importPackages(FIXTURES);

    static List<Rule> rules() {
        return ArchitectureRules.all();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("rules")
    void theProgramKeepsTheRule(Rule rule) {
        rule.on(ROOT).check(PROGRAM);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("rules")
    void theRuleNamesWhatBreaksItAndNothingElse(Rule rule) {
        JavaClasses fixture = FIXTURE_CLASSES.that(resideInAPackage(root(rule) + ".."));

        String report = rule.on(root(rule)).evaluate(fixture).getFailureReport().toString();

        assertThat(offenders(report)).as(report).isEqualTo(marked(fixture));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("rules")
    void theRuleHasAFixtureThatBreaksIt(Rule rule) {
        assertThat(marked(FIXTURE_CLASSES.that(resideInAPackage(root(rule) + ".."))))
                .isNotEmpty();
    }

    @Test
    void everyFixtureBelongsToOneRule() {
        assertThat(FIXTURE_CLASSES)
                .allSatisfy(fixture -> assertThat(rules())
                        .as(fixture.getName())
                        .filteredOn(rule -> resideInAPackage(root(rule) + "..").test(fixture))
                        .hasSize(1));
    }

    @Test
    void theRulesSeeTheProgram() {
        assertThat(PROGRAM.size())
                .as("classes of the program seen by the rules: LAST_COUNT only rises")
                .isGreaterThanOrEqualTo(LAST_COUNT);
    }

    @Test
    void theRulesSeeNoTests() {
        assertThat(PROGRAM)
                .noneSatisfy(seen -> assertThat(seen.getPackageName()).startsWith(ROOT + ".architecture"));
    }

    private static String root(Rule rule) {
        return FIXTURES + "." + rule.name();
    }

    private static Set<String> offenders(String report) {
        return OFFENDER.matcher(report)
                .results()
                .map(MatchResult::group)
                .map(named -> named.substring(named.indexOf('<') + 1, named.length() - 1))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static Set<String> marked(JavaClasses fixture) {
        Set<String> names = new TreeSet<>();
        for (JavaClass type : fixture) {
            if (type.isAnnotatedWith(Violates.class)) {
                names.add(type.getFullName());
            }
            type.getMembers().stream()
                    .filter(member -> member.isAnnotatedWith(Violates.class))
                    .map(JavaMember::getFullName)
                    .forEach(names::add);
        }
        return names;
    }
}

package org.steamwitness.finding;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class FindingTest {

    @ParameterizedTest
    @EnumSource(FindingKind.class)
    void everyKindSaysWhatItFoundAndWhatToDo(FindingKind kind) {
        Map<String, String> facts =
                Finding.factsOf(kind).stream().collect(Collectors.toMap(name -> name, name -> "<" + name + ">"));
        Finding finding = new Finding(kind, Position.RUN, facts);
        assertThat(finding.text()).isNotBlank().doesNotContain("{").doesNotContain("}");
        assertThat(finding.remedy()).endsWith(".").doesNotContain("{");
        assertThat(kind.word()).matches("[a-z]+(-[a-z]+)*");
    }

    /** The program documents; it never says that a product may leave. */
    @ParameterizedTest
    @EnumSource(FindingKind.class)
    void noKindReleasesAnything(FindingKind kind) {
        assertThat(kind.text() + kind.remedy())
                .doesNotContainIgnoringCase("released")
                .doesNotContainIgnoringCase("sterile")
                .doesNotContainIgnoringCase("accepted");
    }

    @Test
    void refusesFactsThatAreMissingOrUnasked() {
        assertThatThrownBy(() -> new Finding(FindingKind.ENTRY_MISSING, Position.RUN, Map.of()))
                .hasMessage("ENTRY_MISSING asks for the facts [entry], got []");
        assertThatThrownBy(() -> new Finding(FindingKind.LOG_EMPTY, Position.RUN, Map.of("why", "?")))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void keepsFactsThatLookLikeWordsOfTheCatalogue() {
        Finding finding = new Finding(FindingKind.ENTRY_MISSING, Position.RUN, Map.of("entry", "$1 {entry} \\ back"));
        assertThat(finding.text()).contains("$1 {entry} \\ back");
    }

    @Test
    void positionsReadAsFileLineColumnPath() {
        assertThat(new Position("a.plan.yaml", 9, 5, "hold.duration").text())
                .isEqualTo("a.plan.yaml:9:5: hold.duration");
        assertThat(Position.ofLine("a.csv", 187).text()).isEqualTo("a.csv:187");
        assertThat(Position.RUN.text()).isEmpty();
        assertThat(Position.RUN.inFile()).isFalse();
    }
}

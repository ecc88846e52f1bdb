package org.steamwitness.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.quantity.Datum;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

class PlanDraftTest {

    private static final List<FoundColumn> COLUMNS = List.of(
            temperature("T1 steam", Place.CHAMBER),
            temperature("T2 drain", Place.DRAIN),
            new FoundColumn(
                    "P1 (bar g)",
                    Optional.of(QuantityKind.PRESSURE),
                    Optional.of("bar"),
                    Optional.of(Datum.GAUGE),
                    Optional.of(Place.CHAMBER)),
            temperature("T3 \"can\" \\ centre [degC]", Place.PRODUCT),
            FoundColumn.named("Valve 7"),
            FoundColumn.named("12"),
            new FoundColumn(
                    "P2",
                    Optional.of(QuantityKind.PRESSURE),
                    Optional.empty(),
                    Optional.empty(),
                    Optional.of(Place.CHAMBER)));

    @Test
    void fillsThePresetsChannelsFromTheColumnsAndAddsTheOthers() {
        String draft = PlanDraft.of(Preset.of(CycleProcess.RETORT), COLUMNS);
        Plan plan = plan(Filled.plan(draft));
        assertThat(plan.channels())
                .extracting(PlannedChannel::name)
                .containsExactly("chamber", "drain", "pressure", "can-1", "valve-7", "channel-12", "p2");
        assertThat(plan.channels())
                .extracting(channel -> channel.rule().header())
                .containsExactly(
                        "T1 steam", "T2 drain", "P1 (bar g)", "T3 \"can\" \\ centre [degC]", "Valve 7", "12", "P2");
        assertThat(plan.channels().get(2).rule().datum()).isEqualTo(Datum.GAUGE);
        assertThat(PlanDraft.openPlaces(draft))
                .extracting(place -> place.position().path())
                .contains("channels[4].quantity", "channels[6].place", "channels[6].datum")
                .doesNotContain("channels[0].column", "channels[2].unit");
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void readsWithoutProblemsOnceFilledIn(CycleProcess process) {
        for (List<FoundColumn> columns :
                List.of(List.<FoundColumn>of(), COLUMNS, List.of(FoundColumn.named("A"), FoundColumn.named("A")))) {
            String draft = PlanDraft.of(Preset.of(process), columns);
            assertThat(plan(Filled.plan(draft)).process()).isEqualTo(process);
        }
    }

    @ParameterizedTest
    @EnumSource(CycleProcess.class)
    void namesEveryOpenPlaceAtTheTop(CycleProcess process) {
        String draft = PlanDraft.of(Preset.of(process), COLUMNS);
        List<String> top = draft.lines().takeWhile(line -> !line.isBlank()).toList();
        assertThat(top.get(0)).isEqualTo("# Draft from the preset " + process.word() + ", approved by nobody.");
        assertThat(PlanDraft.openPlaces(draft))
                .isNotEmpty()
                .allSatisfy(place -> assertThat(top)
                        .anyMatch(line ->
                                line.startsWith("#   " + place.position().path() + ": ")));
        assertThat(top).hasSize(PlanDraft.openPlaces(draft).size() + 2);
    }

    @Test
    void keepsAChannelThatTheHoldNeedsEvenWithoutAColumn() {
        String draft = PlanDraft.of(Preset.of(CycleProcess.RETORT), List.of(temperature("T1", Place.CHAMBER)));
        assertThat(draft).contains("{name: \"drain\", column: \"?\"").contains("preset's channel can-1 (temperature");
        assertThat(plan(Filled.plan(draft)).channels())
                .extracting(PlannedChannel::name)
                .containsExactly("chamber", "drain");
    }

    @Test
    void hostileHeadersStayTextAndOneLine() {
        String header = "x\"}\n]: # \u2028 \u0000 \uD83D\uDE00";
        String draft = PlanDraft.of(Preset.of(CycleProcess.STUDY), List.of(temperature(header, Place.DRAIN)));
        assertThat(plan(Filled.plan(draft)).channels())
                .extracting(channel -> channel.rule().header())
                .contains(header);
    }

    private static FoundColumn temperature(String header, Place place) {
        return new FoundColumn(
                header,
                Optional.of(QuantityKind.TEMPERATURE),
                Optional.of("degC"),
                Optional.empty(),
                Optional.of(place));
    }

    private static Plan plan(String text) {
        AsWritten<Plan> read = Plan.read("p.yaml", text.getBytes(StandardCharsets.UTF_8));
        assertThat(PlanLanguageTest.messages(read)).isEmpty();
        return read.value().orElseThrow();
    }
}

package org.steamwitness.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/** What only the whole plan can tell. */
final class PlanCheck {

    private PlanCheck() {}

    static void check(Section at, Plan plan) {
        boolean guarded = plan.decision().guarded()
                || plan.limits().stream()
                        .flatMap(limit -> limit.decision().stream())
                        .anyMatch(DecisionRule::guarded);
        Set<String> names = new HashSet<>();
        for (PlannedChannel channel : plan.channels()) {
            if (!names.add(channel.name())) {
                at.refuse("channels", "two channels are named \"" + channel.name() + "\"");
            }
            if (guarded
                    && channel.mayStateUncertainty()
                    && channel.uncertainty().isEmpty()) {
                at.refuse(
                        "channels",
                        "a guarded decision needs the uncertainty of channel \"" + channel.name()
                                + "\"; state it, or decide by the simple rule");
            }
        }
        Map<String, PlannedChannel> byName = new HashMap<>();
        plan.channels().forEach(channel -> byName.put(channel.name(), channel));
        plan.steps().forEach(step -> starts(at, step.hold(), byName));
        for (Limit limit : plan.limits()) {
            limit.scope().channels().stream()
                    .filter(name -> !names.contains(name))
                    .forEach(name -> at.refuse(
                            "limits",
                            limit.what().word() + ".channels names \"" + name + "\", which is not among the channels"));
        }
        plan.limits().stream()
                .flatMap(limit -> limit.terms().name().stream())
                .filter(name ->
                        plan.lethality().stream().noneMatch(aim -> aim.name().equals(name)))
                .forEach(name -> at.refuse("limits", "name is \"" + name + "\", which is no lethality of this plan"));
        plan.chamber().ifPresent(chamber -> chamber(at, chamber, byName));
        if (plan.atmosphere() instanceof AtmosphereSource.Measured measured) {
            PlannedChannel channel = byName.get(measured.name());
            if (channel == null || channel.rule().kind() != QuantityKind.PRESSURE) {
                at.refuse("atmosphere", "channel names \"" + measured.name() + "\", which is no pressure channel");
            }
        }
        for (LethalityAim aim : plan.lethality()) {
            for (String probe : aim.probes().names()) {
                PlannedChannel channel = byName.get(probe);
                if (channel == null || channel.rule().kind() != QuantityKind.TEMPERATURE) {
                    at.refuse("lethality", "channels names \"" + probe + "\", which is no temperature channel");
                }
            }
        }
        long pressures = plan.channels().stream()
                .filter(c -> c.rule().kind() == QuantityKind.PRESSURE && c.place() == Place.CHAMBER)
                .count();
        if (pressures > 1) {
            at.refuse("channels", "two channels measure the chamber's pressure; expected one");
        }
        if (plan.process().holds()
                && plan.medium().saturated()
                && plan.saturation().isEmpty()) {
            at.refuse("saturation", "required key is missing: the medium is saturated steam");
        }
    }

    private static void starts(Section at, Hold hold, Map<String, PlannedChannel> byName) {
        for (String start : hold.startChannels()) {
            PlannedChannel channel = byName.get(start);
            if (channel == null) {
                at.refuse("hold", "starts.channels names \"" + start + "\", which is not among the channels");
            } else if (channel.rule().kind() != QuantityKind.TEMPERATURE || channel.place() == Place.PRODUCT) {
                at.refuse("hold", "starts.channels names \"" + start + "\"; expected a temperature in the chamber");
            }
        }
    }

    private static void chamber(Section at, Chamber chamber, Map<String, PlannedChannel> byName) {
        List<String> names = new ArrayList<>();
        chamber.metal().ifPresent(metal -> names.addAll(metal.channels()));
        chamber.load().ifPresent(load -> names.addAll(load.channels()));
        for (String name : names) {
            PlannedChannel channel = byName.get(name);
            if (channel == null || channel.rule().kind() != QuantityKind.TEMPERATURE) {
                at.refuse("chamber", "temperature names \"" + name + "\", which is no temperature channel");
            }
        }
    }
}

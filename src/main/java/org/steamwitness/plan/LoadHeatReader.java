package org.steamwitness.plan;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.quantity.AmountText;

/** Understands how a load's uptake of heat is given: a specific heat, a composition, or materials. */
final class LoadHeatReader {

    private static final List<String> WAYS = List.of("specific-heat", "composition", "materials");

    private LoadHeatReader() {}

    static Entry<LoadHeat> heat(Section at) {
        boolean parts = at.has("materials");
        Entry<Double> mass = mass(parts ? at.may("mass") : at.need("mass"));
        Entry<Double> stated = at.may("specific-heat")
                .parsed("a specific heat such as 3.55 kJ/(kg K)", AmountText::specificHeatJoulePerKilogramKelvin);
        Entry<Map<LoadHeat.Component, Double>> food = at.may("composition").section(LoadHeatReader::shares);
        Entry<List<LoadHeat.Part>> made = at.may("materials").list(each -> each.section(LoadHeatReader::part));
        long given = WAYS.stream().filter(at::has).count();
        if (given != 1) {
            throw new IllegalArgumentException("expected one of: " + String.join(", ", WAYS));
        }
        if (parts && at.has("mass")) {
            return at.may("mass").refused("each of the materials has a mass of its own");
        }
        if (parts) {
            return Entry.of(new LoadHeat.Parts(made.get()));
        }
        return Entry.of(
                at.has("composition")
                        ? new LoadHeat.Food(mass.get(), food.get())
                        : new LoadHeat.Stated(mass.get(), stated.get()));
    }

    private static Entry<Double> mass(Slot slot) {
        return slot.parsed("a mass such as 410 kg", AmountText::massKilogram);
    }

    private static Map<LoadHeat.Component, Double> shares(Section at) {
        Map<LoadHeat.Component, Entry<Double>> written = new EnumMap<>(LoadHeat.Component.class);
        for (LoadHeat.Component component : LoadHeat.Component.values()) {
            Slot slot = component == LoadHeat.Component.WATER ? at.need("water") : at.may(component.word());
            written.put(component, slot.parsed("a share such as 12 %", AmountText::fraction));
        }
        Map<LoadHeat.Component, Double> shares = new EnumMap<>(LoadHeat.Component.class);
        written.forEach((component, entry) -> {
            Optional<Double> share = entry.optional();
            share.ifPresent(value -> shares.put(component, value));
        });
        return shares;
    }

    private static LoadHeat.Part part(Section at) {
        Entry<Double> mass = mass(at.need("mass"));
        Entry<Material> material = at.need("material").word(Material.class, Material::word);
        return new LoadHeat.Part(mass.get(), material.get());
    }
}

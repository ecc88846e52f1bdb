package org.steamwitness.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.steamwitness.quantity.AmountText;
import org.steamwitness.quantity.PressureReading;
import org.steamwitness.quantity.QuantityText;
import org.steamwitness.quantity.RateText;

/** Understands {@code chamber}. */
final class ChamberReader {

    private ChamberReader() {}

    static Chamber chamber(Section at) {
        Entry<Boolean> inside = at.need("steam").either("raised-inside", "supplied");
        Entry<Double> volume = at.may("volume").parsed("a volume such as 1.9 m3", AmountText::volumeCubicMetre);
        Entry<Double> free = at.may("free-volume").parsed("a volume such as 1.3 m3", AmountText::volumeCubicMetre);
        Entry<Chamber.Metal> metal = at.may("metal").section(ChamberReader::metal);
        Entry<Chamber.Load> load = at.may("load").section(ChamberReader::load);
        Entry<Double> loss = at.may("heat-loss").parsed("a heat loss such as 28 W/K", RateText::heatLossWattPerKelvin);
        Entry<PressureReading> most =
                at.may("maximum-pressure").parsed("a pressure such as 3.0 bar(g)", QuantityText::pressure);
        return new Chamber(
                inside.get(),
                number(volume),
                number(free),
                metal.optional(),
                load.optional(),
                number(loss),
                most.optional());
    }

    private static Chamber.Metal metal(Section at) {
        Entry<Double> mass = at.need("mass").parsed("a mass such as 640 kg", AmountText::massKilogram);
        Entry<Material> material = at.need("material").word(Material.class, Material::word);
        Entry<List<String>> channels = at.need("temperature").oneOrMore();
        return new Chamber.Metal(mass.get(), material.get(), channels.get());
    }

    private static Chamber.Load load(Section at) {
        Entry<List<String>> channels = at.need("temperature").oneOrMore();
        Entry<Chamber.LoadProbes> probes = at.need("probes").word(Chamber.LoadProbes.class, Chamber.LoadProbes::word);
        Entry<LoadHeat> heat = LoadHeatReader.heat(at);
        return new Chamber.Load(heat.get(), channels.get(), probes.get());
    }

    static OptionalDouble number(Entry<Double> entry) {
        Optional<Double> value = entry.optional();
        return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
    }
}

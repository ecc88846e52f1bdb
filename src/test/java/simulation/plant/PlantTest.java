package simulation.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Vessels that mass flows into or out of: worked examples of the first law. */
class PlantTest {

    private final Water water = new Water();

    @Test
    void ventingAPotTakesTheHeatOfExampleD() throws IOException {
        Example example = new Example("D");
        Contents pot = new Contents(water, 0.012, 1.0, 0, 115);
        assertThat(pot.joule()).isCloseTo(example.value("U1") * 1e3, Example.CLOSE);
        Equipment equipment = new Equipment().pool().vent(0.0006, 0);
        Body metal = new Body(115, 4000, 10, new double[] {500});
        Plant plant = new Plant(water, new Room(20, 101_325), equipment, pot, metal, List.of(), 20);
        Settings venting = Settings.shut().vent(1).heater(6000, 115);
        new Cycle(List.of(
                        new Step("venting", venting, (p, since) -> p.contents().waterKg() <= 0.8)))
                .run(plant, List.of());
        assertThat(pot.state().celsius()).isCloseTo(115, within(0.1));
        assertThat(plant.ledger().of(Flow.VENTED_J)).isCloseTo(example.value("H_out") * 1e3, Example.CLOSE);
        assertThat(pot.joule()).isCloseTo(example.value("U2") * 1e3, Example.CLOSE);
        assertThat(plant.ledger().of(Flow.CONTENTS_HEAT_J)).isCloseTo(example.value("Q") * 1e3, Example.CLOSE);
    }

    @Test
    void fillingAnEmptyChamberWarmsItsWallsAsInExampleG() throws IOException {
        Example example = new Example("G");
        double pascal = water.pascal(134);
        SteamSupply main = new SteamSupply(pascal, water.hg(134), 0.01, 0, List.of());
        Equipment equipment = new Equipment().supply(main).condensate(1e12, 0);
        Body walls = new Body(60, 2000, 200, new double[] {30 * 500});
        Contents chamber = new Contents(water, 0.1, 1e-4, 0, 60);
        Plant plant = new Plant(water, new Room(20, 101_325), equipment, chamber, walls, List.of(), 20);
        new Cycle(List.of(Step.of("filling", 3000, Settings.shut().steam(1)))).run(plant, List.of());
        GasState gas = chamber.state();
        assertThat(walls.core()).isCloseTo(134, within(0.3));
        assertThat(gas.vapourKg()).isCloseTo(example.value("m_vapour"), Example.CLOSE);
        assertThat(plant.sumpKg() + gas.liquidKg()).isCloseTo(example.value("m_condensate"), Example.CLOSE);
        assertThat(plant.ledger().of(Flow.STEAM_KG)).isCloseTo(example.value("m_in"), Example.CLOSE);
        assertThat(plant.ledger().of(Flow.METAL_HEAT_J)).isCloseTo(example.value("wall_heat") * 1e3, Example.CLOSE);
    }

    @Test
    void aLeakIntoAVacuumRaisesThePressureAtItsRate() {
        double volume = 0.5;
        double kg = 1e-5;
        Contents chamber = new Contents(water, volume, 0, 0.02, 45);
        Equipment equipment = new Equipment().leak(kg, List.of(Window.always()));
        Body walls = new Body(45, 3000, 400, new double[] {100_000});
        Plant plant = new Plant(water, new Room(22, 101_325), equipment, chamber, walls, List.of(), 10);
        double before = chamber.state().pascal();
        new Cycle(List.of(Step.of("test", 600, Settings.shut()))).run(plant, List.of());
        double rate = (chamber.state().pascal() - before) / 600;
        assertThat(rate).isCloseTo(kg * Air.GAS_CONSTANT * 318.15 / volume, Example.CLOSE);
    }
}

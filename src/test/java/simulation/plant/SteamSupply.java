package simulation.plant;

import java.util.List;

/**
 * The steam main before the admission valve.
 *
 * @param pascal pressure of the main
 * @param enthalpy of the steam, J/kg
 * @param kgPerSecond through the valve when it is fully open and the chamber is empty
 * @param dryEnthalpy of the steam in the dry spells, J/kg
 * @param drySpells when the main sends superheated steam
 */
public record SteamSupply(
        double pascal, double enthalpy, double kgPerSecond, double dryEnthalpy, List<Window> drySpells) {

    /** A main of wet steam. */
    public static SteamSupply wet(Water water, double pascal, double dryness, double kgPerSecond) {
        double celsius = water.celsius(pascal);
        double enthalpy = water.hf(celsius) + dryness * (water.hg(celsius) - water.hf(celsius));
        return new SteamSupply(pascal, enthalpy, kgPerSecond, enthalpy, List.of());
    }

    /** No steam from outside. */
    public static SteamSupply none() {
        return new SteamSupply(1, 0, 0, 0, List.of());
    }

    /** The same main with spells of superheated steam. */
    public SteamSupply drying(double joulePerKg, List<Window> when) {
        return new SteamSupply(pascal, enthalpy, kgPerSecond, joulePerKg, when);
    }

    double flow(double opening, double chamberPascal) {
        return kgPerSecond * opening * Nozzle.share(chamberPascal, pascal);
    }

    double enthalpyAt(Timeline timeline) {
        return drySpells.stream().anyMatch(spell -> spell.isOpen(timeline)) ? dryEnthalpy : enthalpy;
    }
}

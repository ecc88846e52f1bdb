package simulation.plant;

/** What the books keep, summed from the start of the run. Masses in kilogram, energies in joule. */
public enum Flow {
    STEAM_KG,
    STEAM_J,
    COOLING_WATER_KG,
    COOLING_WATER_J,
    AIR_IN_KG,
    AIR_IN_J,
    LEAKED_AIR_KG,
    VENTED_VAPOUR_KG,
    VENTED_AIR_KG,
    VENTED_J,
    PUMPED_VAPOUR_KG,
    PUMPED_AIR_KG,
    PUMPED_J,
    DRAINED_KG,
    DRAINED_J,
    CONDENSED_KG,
    METAL_HEAT_J,
    LOAD_HEAT_J,
    CONTENTS_HEAT_J,
    LOSS_J,
    HEATER_J,
    JACKET_J
}

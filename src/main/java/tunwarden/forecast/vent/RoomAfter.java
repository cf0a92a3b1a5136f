package tunwarden.forecast.vent;

import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;

/**
 * The room's air after a vent, mixed well, by mole fraction with what was there before.
 *
 * @param onceCo2 CO2 after what leaves at once
 * @param heldCo2 CO2 after what follows too, without ventilation
 * @param ventilatedCo2 highest CO2 with the room's air changes, vent held open; empty without any
 * @param leastOxygen oxygen left, held open, without ventilation
 */
public record RoomAfter(
    Spread onceCo2, Spread heldCo2, Optional<Spread> ventilatedCo2, double leastOxygen) {}

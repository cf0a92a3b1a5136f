package tunwarden.forecast.vent;

import java.util.Optional;
import tunwarden.forecast.TimeRange;

/**
 * One step of a staged vent: let the pressure down, then keep letting gas out at that level for a
 * while.
 *
 * @param toPaGauge pressure to go down to, Pa gauge
 * @param supersaturation dissolved over equilibrium on arrival there, minus 1
 * @param leavesAtOnceKg headspace gas that leaves on the way down, kg
 * @param followsKg gas that comes out of the liquid during the wait, kg
 * @param hold how long to hold before the next step; empty for the last
 */
public record Stage(
    double toPaGauge,
    double supersaturation,
    double leavesAtOnceKg,
    double followsKg,
    Optional<TimeRange> hold) {}

package tunwarden.estimate.bank;

/**
 * One reading as the bank sees it.
 *
 * @param seconds since the bank was last moved
 * @param kelvin liquid temperature
 * @param paAbsolute total pressure by gauge and nominal ambient, Pa absolute
 * @param variance of the reading, Pa squared
 * @param flowing whether gas passes a valve
 */
public record Look(
    double seconds, double kelvin, double paAbsolute, double variance, boolean flowing) {}

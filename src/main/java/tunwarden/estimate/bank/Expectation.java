package tunwarden.estimate.bank;

/**
 * Where the bank expects the pressure to go next.
 *
 * @param paDry dry absolute pressure now, Pa
 * @param slowest lowest rate any filter of weight expects, Pa/s
 * @param fastest highest such rate, Pa/s
 */
public record Expectation(double paDry, double slowest, double fastest) {}

package tunwarden.estimate.bank;

/**
 * The mixture boiled down to numbers.
 *
 * @param dissolved kg/m3
 * @param dissolvedU95 half-width of the symmetric 95 % interval, kg/m3
 * @param equilibrium what the liquid would hold at rest with the present headspace, kg/m3
 * @param airFraction of the headspace, 0..1
 * @param airU95 its 95 % half-width
 * @param transfer quantiles 2.5, 50, 97.5 % of kLa, 1/s
 * @param made gas being made, kg/m3/s; negative when leaking
 * @param madeU its standard uncertainty
 */
public record Summary(
    double dissolved,
    double dissolvedU95,
    double equilibrium,
    double airFraction,
    double airU95,
    double[] transfer,
    double made,
    double madeU) {}

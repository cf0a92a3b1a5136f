package tunwarden.physics.answer;

import java.util.List;
import java.util.OptionalDouble;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.Constants;

/**
 * Solubility of one gas in one liquid at one temperature, in the forms handbooks print, each at the
 * limit of low pressure or at the standard pressure it is defined for.
 *
 * @param henryPa Henry fugacity on the mole fraction, Pa; for a drink, that of water over the
 *     drink's factor
 * @param bunsen volume of the real gas at 0 °C and 1 atm dissolved per volume of liquid at a
 *     partial pressure of 1 atm
 * @param kgPerM3PerBar dissolved amount at a partial pressure of 1 bar, kg/m³, which is g/L
 * @param relativeU95 relative expanded uncertainty of all three, 95 %
 */
public record Solubility(Answer henryPa, Answer bunsen, Answer kgPerM3PerBar, double relativeU95) {
  private static final double BAR = 1e5;

  /** Computes all three. */
  public static Solubility of(Liquid liquid, Gas gas, double temperatureK) {
    LiquidSolubility solubility = LiquidSolubility.of(liquid);
    String model = solubility.model(gas);
    double relative = 1.96 * solubility.relativeStandardUncertainty(gas);
    if (!Double.isFinite(temperatureK) || temperatureK <= 0) {
      Answer none = Answer.none(model, "the temperature is not a number above absolute zero");
      return new Solubility(none, none, none, relative);
    }
    double vapour = solubility.vapourPressurePa(temperatureK);
    double atBar = solubility.dissolvedKgPerM3(gas, BAR, BAR + vapour, temperatureK);
    double atm = Constants.STANDARD_ATMOSPHERE_PA;
    double atAtm = solubility.dissolvedKgPerM3(gas, atm, atm + vapour, temperatureK);
    List<String> remarks = solubility.breaches(gas, atm + vapour, temperatureK);
    double normal = RealGas.z(gas, atm, Constants.ZERO_CELSIUS_K);
    double molPerM3 = atm / (normal * Constants.GAS_CONSTANT * Constants.ZERO_CELSIUS_K);
    double bunsen = atAtm / gas.molarMass() / molPerM3;
    return new Solubility(
        answer(solubility.henryPa(gas, temperatureK), relative, model, remarks),
        answer(bunsen, relative, model, remarks),
        answer(atBar, relative, model, remarks),
        relative);
  }

  private static Answer answer(double value, double relative, String model, List<String> remarks) {
    return new Answer(OptionalDouble.of(value), value * relative, model, remarks);
  }
}

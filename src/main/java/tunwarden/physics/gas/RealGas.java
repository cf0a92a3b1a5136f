package tunwarden.physics.gas;

import tunwarden.units.Constants;

/**
 * Departure of dry headspace gas from the ideal gas, by the virial series in pressure. Every pair
 * without CO2 is taken to mix ideally: N2–O2 departs by 0.4 cm³/mol, which is 0.01 % at 5 bar.
 */
public final class RealGas {
  /** Above this the series is held at its value here, so that no answer runs away; Pa. */
  public static final double SERIES_LIMIT_PA = 40e5;

  private RealGas() {}

  /** Second virial coefficient of a pure gas, m³/mol. */
  public static double second(Gas gas, double temperatureK) {
    return gas == Gas.CO2
        ? Weiss1974Virial.second(temperatureK)
        : Tsonopoulos1974.second(gas, temperatureK);
  }

  /** Excess of the pair CO2–gas over the mean of the pure coefficients, m³/mol; 0 for CO2. */
  public static double excessWithCo2(Gas gas, double temperatureK) {
    return switch (gas) {
      case CO2 -> 0;
      case N2, O2, AR -> Weiss1974Virial.excessWithAir(temperatureK);
      default ->
          Tsonopoulos1974.cross(Gas.CO2, gas, temperatureK)
              - (Tsonopoulos1974.second(Gas.CO2, temperatureK)
                      + Tsonopoulos1974.second(gas, temperatureK))
                  / 2;
    };
  }

  /** Compressibility of a pure gas. */
  public static double z(Gas gas, double paAbsolute, double temperatureK) {
    double density = reduced(paAbsolute, temperatureK);
    double third = gas == Gas.CO2 ? Weiss1974Virial.third(temperatureK) : 0;
    return 1 + density * (second(gas, temperatureK) + density * third);
  }

  /** Compressibility of a dry blend. */
  public static double z(GasMix mix, double paAbsolute, double temperatureK) {
    double co2 = mix.fraction(Gas.CO2);
    double second = 0;
    for (Gas gas : Gas.all()) {
      double share = mix.fraction(gas);
      if (share > 0) {
        second += share * (second(gas, temperatureK) + 2 * co2 * excessWithCo2(gas, temperatureK));
      }
    }
    double density = reduced(paAbsolute, temperatureK);
    double third = co2 * co2 * co2 * Weiss1974Virial.third(temperatureK);
    return 1 + density * (second + density * third);
  }

  /** Fugacity coefficient of a pure gas. */
  public static double fugacityCoefficient(Gas gas, double paAbsolute, double temperatureK) {
    return fugacityCoefficient(gas, GasMix.pure(gas), paAbsolute, temperatureK);
  }

  /** Fugacity coefficient of one gas in a dry blend. */
  public static double fugacityCoefficient(
      Gas gas, GasMix mix, double paAbsolute, double temperatureK) {
    double co2 = mix.fraction(Gas.CO2);
    double excess = 0; // sum of y times excess over the blend
    for (Gas other : Gas.all()) {
      double share = mix.fraction(other);
      if (share > 0) {
        excess += share * excessWithCo2(other, temperatureK);
      }
    }
    double own = gas == Gas.CO2 ? excess : co2 * excessWithCo2(gas, temperatureK);
    // n d(nB)/dn_i with B = sum(y B) + 2 y_co2 sum(y excess)
    double second = second(gas, temperatureK) + 2 * own - 2 * co2 * excess;
    double shape = (gas == Gas.CO2 ? 3 * co2 * co2 : 0) - 2 * co2 * co2 * co2;
    double third = shape * Weiss1974Virial.third(temperatureK);
    double density = reduced(paAbsolute, temperatureK);
    return Math.exp(density * (second + density * third / 2));
  }

  /** p/RT, mol/m³, held at the series limit. */
  static double reduced(double paAbsolute, double temperatureK) {
    return Math.min(paAbsolute, SERIES_LIMIT_PA) / (Constants.GAS_CONSTANT * temperatureK);
  }
}

package tunwarden.physics.solubility;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import tunwarden.physics.Correlation;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.WagnerPruss1993;

/**
 * How much of each gas one liquid holds at equilibrium. Immutable and thread-safe. Every method is
 * defined for any finite state; {@link #breaches} says when a correlation is used outside its
 * range.
 */
public final class LiquidSolubility {
  private static final double HENRY_AT_PA = 1e5;
  private static final LiquidSolubility WATER = of(Liquid.WATER);

  private final Drink drink;

  private LiquidSolubility(Drink drink) {
    this.drink = drink;
  }

  /** The solubility relations that fit a liquid. */
  public static LiquidSolubility of(Liquid liquid) {
    return new LiquidSolubility(Drink.of(liquid));
  }

  /** The same with CO2's solubility multiplied, to try what an error of the relation would do. */
  public LiquidSolubility scaled(double co2Factor) {
    return new LiquidSolubility(drink.scaled(co2Factor));
  }

  /** A line for one gas, to be prepared at a temperature and evaluated often. */
  public GasLine line(Gas gas) {
    return new GasLine(drink, gas);
  }

  /**
   * Dissolved gas at equilibrium, kg per m³ of liquid.
   *
   * @param gas which gas
   * @param partialPa its partial pressure in the headspace, Pa
   * @param totalPaAbsolute total pressure, Pa absolute
   * @param temperatureK temperature, K
   */
  public double dissolvedKgPerM3(
      Gas gas, double partialPa, double totalPaAbsolute, double temperatureK) {
    return line(gas).prepareAt(temperatureK).dissolvedKgPerM3(partialPa, totalPaAbsolute);
  }

  /**
   * Partial pressure in equilibrium with a dissolved amount, Pa.
   *
   * @param gas which gas
   * @param dissolvedKgPerM3 dissolved amount, kg per m³ of liquid
   * @param totalPaAbsolute total pressure, Pa absolute
   * @param temperatureK temperature, K
   */
  public double partialPa(
      Gas gas, double dissolvedKgPerM3, double totalPaAbsolute, double temperatureK) {
    return line(gas).prepareAt(temperatureK).partialPa(dissolvedKgPerM3, totalPaAbsolute);
  }

  /**
   * Pressure of the vapour over the liquid, Pa: water's; that of alcohol (10 mbar at most) is not
   * counted.
   */
  public double vapourPressurePa(double temperatureK) {
    return WagnerPruss1993.pa(temperatureK);
  }

  /**
   * Henry fugacity, Pa on the mole fraction, at low pressure: water's, over what the drink holds
   * compared with water at a partial pressure of 1 bar.
   */
  public double henryPa(Gas gas, double temperatureK) {
    GasLine line = line(gas).prepareAt(temperatureK);
    double held = line.temperatureK();
    double total = HENRY_AT_PA + line.vapourPa();
    double water = WATER.line(gas).prepareAt(held).dissolvedKgPerM3(HENRY_AT_PA, total);
    double ratio = line.dissolvedKgPerM3(HENRY_AT_PA, total) / water;
    return Math.exp(WaterLine.lnHenryPa(gas, held)) / ratio;
  }

  /** Relative standard uncertainty (one sigma) of the dissolved amount at equilibrium. */
  public double relativeStandardUncertainty(Gas gas) {
    return drink.relativeStandardUncertainty(gas);
  }

  /** The correlations behind the number, in words. */
  public String model(Gas gas) {
    return correlations(gas).stream().map(Correlation::name).collect(Collectors.joining(", "));
  }

  /** The correlations behind the number, as data. */
  public List<Correlation> correlations(Gas gas) {
    return drink.correlations(gas);
  }

  /** One sentence for each correlation used outside its range; empty inside all of them. */
  public List<String> breaches(Gas gas, double totalPaAbsolute, double temperatureK) {
    List<String> sentences = new ArrayList<>();
    for (Correlation correlation : correlations(gas)) {
      correlation.breach(temperatureK, totalPaAbsolute).ifPresent(sentences::add);
    }
    return sentences;
  }
}

package tunwarden.physics.solubility;

import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;

/**
 * One gas in one liquid, prepared at one temperature, for code that evaluates often: preparing
 * costs a few logarithms, evaluating one or two exponentials, and neither allocates. Not
 * thread-safe.
 *
 * <p>A trade relation for CO2 enters as a factor on water: relation over water at the same CO2
 * pressure under CO2 and water vapour alone. It so reproduces the relation exactly there and
 * carries it to mixed headspaces. Outside the relation's range the factor is held at its value on
 * the edge.
 */
public final class GasLine {
  private static final int MOST_STEPS = 60;
  private static final double CLOSE_ENOUGH = 3e-9;

  private final Drink drink;
  private final Gas gas;
  private final TradeRelation relation;
  private final WaterLine here;
  private final WaterLine beyond;
  private PureWater ownWater;
  private PureWater edgeWater;
  private PureWater water;
  private WaterLine edge;
  private double factor;
  private double slope;
  private double offset;
  private double leastPartial;
  private double mostPartial;

  GasLine(Drink drink, Gas gas) {
    this.drink = drink;
    this.gas = gas;
    this.relation = gas == Gas.CO2 ? drink.relation() : null;
    this.here = new WaterLine(gas);
    this.beyond = relation == null ? null : new WaterLine(gas);
  }

  /** Prepares for a temperature; outside −30..150 °C it is held at that edge. */
  public GasLine prepareAt(double temperatureK) {
    if (ownWater == null) {
      ownWater = new PureWater();
    }
    return prepareAt(ownWater.prepareAt(temperatureK));
  }

  /** Prepares for the temperature of water that is shared with other lines. */
  public GasLine prepareAt(PureWater shared) {
    water = shared;
    here.prepareAt(shared);
    factor = drink.factor(gas, shared.temperatureK());
    if (relation != null) {
      prepareRelation();
    }
    return this;
  }

  private void prepareRelation() {
    Validity held = relation.heldBeyond();
    double temperature = clamp(water.temperatureK(), held.leastK(), held.mostK());
    if (temperature == water.temperatureK()) {
      edge = here;
    } else {
      if (edgeWater == null) {
        edgeWater = new PureWater();
      }
      edge = beyond.prepareAt(edgeWater.prepareAt(temperature));
    }
    slope = relation.slope(temperature);
    offset = relation.offset();
    leastPartial = held.leastPaAbsolute() - edge.vapourPa();
    mostPartial = held.mostPaAbsolute() - edge.vapourPa();
  }

  /** The gas this line is for. */
  public Gas gas() {
    return gas;
  }

  /** Temperature it was last prepared for, K. */
  public double temperatureK() {
    return water.temperatureK();
  }

  /** Water vapour pressure over the liquid, Pa. */
  public double vapourPa() {
    return water.vapourPa();
  }

  /**
   * Dissolved gas at equilibrium, kg per m³ of liquid.
   *
   * @param partialPa partial pressure of the gas, Pa
   * @param totalPaAbsolute total pressure, Pa absolute
   */
  public double dissolvedKgPerM3(double partialPa, double totalPaAbsolute) {
    if (partialPa <= 0) {
      return 0;
    }
    double inWater = factor * here.dissolved(partialPa, totalPaAbsolute);
    return relation == null ? inWater : inWater * relationOverWater(partialPa);
  }

  private double relationOverWater(double partialPa) {
    double within = clamp(partialPa, leastPartial, mostPartial);
    double effective = within + edge.vapourPa();
    return (slope * effective + offset) / edge.dissolved(within, effective);
  }

  /**
   * Partial pressure in equilibrium with a dissolved amount, Pa; the inverse of {@link
   * #dissolvedKgPerM3} at the same total pressure.
   *
   * @param dissolvedKgPerM3 dissolved gas, kg per m³ of liquid
   * @param totalPaAbsolute total pressure, Pa absolute
   */
  public double partialPa(double dissolvedKgPerM3, double totalPaAbsolute) {
    if (dissolvedKgPerM3 <= 0) {
      return 0;
    }
    double previous = totalPaAbsolute;
    double previousDissolved = dissolvedKgPerM3(previous, totalPaAbsolute);
    double guess = previous * dissolvedKgPerM3 / previousDissolved;
    for (int i = 0; i < MOST_STEPS; i++) {
      double dissolved = dissolvedKgPerM3(guess, totalPaAbsolute);
      double miss = dissolvedKgPerM3 - dissolved;
      double secant = (dissolved - previousDissolved) / (guess - previous);
      if (Math.abs(miss) <= CLOSE_ENOUGH * dissolvedKgPerM3) {
        return Double.isFinite(secant) && secant > 0 ? guess + miss / secant : guess;
      }
      double proportional = guess * dissolvedKgPerM3 / dissolved;
      double next = guess + miss / secant;
      previous = guess;
      previousDissolved = dissolved;
      boolean sound = next > 0.5 * proportional && next < 2 * proportional;
      guess = sound ? next : proportional;
    }
    return guess;
  }

  private static double clamp(double value, double least, double most) {
    return Math.max(least, Math.min(most, value));
  }
}

package tunwarden.physics.closed;

import java.util.Arrays;
import tunwarden.physics.gas.DryBlend;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.solubility.GasLine;
import tunwarden.physics.solubility.PureWater;

/**
 * Solves a closed vessel again and again in one workspace: no allocation after the first use of
 * each gas. Not thread-safe; make one per thread. Arrays are in the order of {@link Gas}.
 *
 * <p>For a trial total pressure every gas's share follows in closed form from its own balance, and
 * the shares add up to a new total. That map is a contraction (its slope is the non-ideality, under
 * 0.3 to 20 bar), so repeating it always converges; a secant step, taken only while it stays close
 * to the plain step, shortens the way.
 */
public final class ClosedSolver {
  private static final int GASES = Gas.all().size();
  private static final int MOST_STEPS = 80;
  private static final double CLOSE_ENOUGH = 1e-9;
  private static final double START_PA = 2e5;
  private static final double[] MOLAR_MASS =
      Gas.all().stream().mapToDouble(Gas::molarMass).toArray();

  private final ClosedVessel vessel;
  private final GasLine[] lines = new GasLine[GASES];
  private final PureWater water = new PureWater();
  private final DryBlend blend = new DryBlend();
  private final int[] present = new int[GASES];
  private final double[] partial = new double[GASES];
  private int count;
  private double temperature = Double.NaN;
  private int prepared;
  private double vapour;
  private double liquid;
  private double headspace;
  private double total;
  private double moved;
  private int steps;

  ClosedSolver(ClosedVessel vessel) {
    this.vessel = vessel;
  }

  /** Finds the equilibrium for these amounts, mol, at this temperature, K. */
  public void settle(double[] mol, double temperatureK) {
    prepare(mol, temperatureK);
    double trial = firstTrial(mol);
    double before = Double.NaN;
    double stepBefore = Double.NaN;
    for (steps = 1; steps <= MOST_STEPS; steps++) {
      pass(mol, trial);
      double step = total - trial;
      if (moved <= CLOSE_ENOUGH * total) {
        break;
      }
      double next = trial - step * (trial - before) / (step - stepBefore);
      boolean sound = Math.abs(next - total) < Math.abs(step) / 2 && next > vapour;
      before = trial;
      stepBefore = step;
      trial = sound ? next : total;
      scale((trial - vapour) / (total - vapour));
    }
    if (headspace <= 0 && liquid > 0) {
      double squeeze = (liquid - vessel.volumeM3()) / liquid;
      total += squeeze / Kell1975.compressibilityPerPa(temperatureK);
    }
  }

  /** Amounts, mol, in liquid and headspace together at these partial pressures, Pa. */
  public void inventoryAt(
      double[] partialPa, double totalPaAbsolute, double temperatureK, double[] outMol) {
    prepare(partialPa, temperatureK);
    System.arraycopy(partialPa, 0, partial, 0, GASES);
    double gasPhase = headspace * blend.molPerM3Pa(partial);
    Arrays.fill(outMol, 0);
    for (int k = 0; k < count; k++) {
      int i = present[k];
      outMol[i] = partial[i] * gasPhase + liquid * dissolvedMol(i, partial[i], totalPaAbsolute);
    }
    total = totalPaAbsolute;
  }

  /** Total pressure, Pa absolute; see {@link ClosedState#totalPaAbsolute}. */
  public double totalPaAbsolute() {
    return total;
  }

  /** Partial pressure of one gas, Pa. */
  public double partialPa(Gas gas) {
    return partial[gas.ordinal()];
  }

  /** Water vapour, Pa. */
  public double vapourPa() {
    return vapour;
  }

  /** Dissolved gas, kg per m³ of liquid. */
  public double dissolvedKgPerM3(Gas gas) {
    double own = partial[gas.ordinal()];
    return own > 0 ? lines[gas.ordinal()].dissolvedKgPerM3(own, gasPa()) : 0;
  }

  /** Room left for gas, m³. */
  public double headspaceM3() {
    return headspace;
  }

  /** Volume the liquid wants, m³. */
  public double liquidM3() {
    return liquid;
  }

  /** True when the liquid has taken the whole vessel. */
  public boolean liquidFull() {
    return headspace <= 0;
  }

  /** Steps the last solve took. */
  int steps() {
    return steps;
  }

  private double gasPa() {
    double sum = vapour;
    for (int k = 0; k < count; k++) {
      sum += partial[present[k]];
    }
    return sum;
  }

  private void prepare(double[] amount, double temperatureK) {
    if (temperatureK != temperature) {
      temperature = temperatureK;
      prepared = 0;
      vapour = water.prepareAt(temperatureK).vapourPa();
      liquid = vessel.liquidM3(temperatureK);
      headspace = Math.max(0, vessel.volumeM3() - liquid);
    }
    count = 0;
    for (int i = 0; i < GASES; i++) {
      partial[i] = 0;
      if (amount[i] > 0) {
        present[count++] = i;
        prepareLine(i);
      }
    }
    blend.prepareAt(temperatureK, amount);
  }

  private void prepareLine(int i) {
    if ((prepared & 1 << i) == 0) {
      prepared |= 1 << i;
      if (lines[i] == null) {
        lines[i] = vessel.solubility().line(Gas.all().get(i));
      }
      lines[i].prepareAt(water);
    }
  }

  private double firstTrial(double[] mol) {
    double sum = vapour;
    double gasPhase = headspace * blend.molPerM3Pa(partial);
    for (int k = 0; k < count; k++) {
      int i = present[k];
      double perPa = dissolvedMol(i, START_PA / 2, START_PA) / (START_PA / 2);
      partial[i] = mol[i] / (gasPhase + liquid * perPa);
      sum += partial[i];
    }
    return sum;
  }

  /** Every gas's balance at a trial pressure; leaves the total and how far the shares moved. */
  private void pass(double[] mol, double trial) {
    double sum = vapour;
    double change = 0;
    double gasPhase = headspace * blend.molPerM3Pa(partial);
    for (int k = 0; k < count; k++) {
      int i = present[k];
      double old = partial[i];
      double perPa = gasPhase + liquid * dissolvedMol(i, old, trial) / old;
      partial[i] = mol[i] / perPa;
      sum += partial[i];
      change += Math.abs(partial[i] - old);
    }
    total = sum;
    moved = change;
  }

  private void scale(double factor) {
    for (int k = 0; k < count; k++) {
      partial[present[k]] *= factor;
    }
  }

  private double dissolvedMol(int i, double partialPa, double totalPa) {
    return lines[i].dissolvedKgPerM3(partialPa, totalPa) / MOLAR_MASS[i];
  }
}

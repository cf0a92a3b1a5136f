package tunwarden.physics.closed;

import java.util.Arrays;
import tunwarden.physics.gas.Gas;

/** How much of each gas a closed vessel holds, liquid and headspace together; immutable. */
public final class Inventory {
  /** No gas at all. */
  public static final Inventory NONE = new Inventory(new double[Gas.all().size()]);

  private final double[] mol;

  private Inventory(double[] mol) {
    this.mol = mol;
  }

  /** Amounts in mol, in the order of {@link Gas}; copied. */
  public static Inventory of(double[] mol) {
    if (mol.length != Gas.all().size()) {
      throw new IllegalArgumentException("an inventory needs one amount for each gas");
    }
    return new Inventory(mol.clone());
  }

  /** Amount of one gas, mol. */
  public double mol(Gas gas) {
    return mol[gas.ordinal()];
  }

  /** Mass of one gas, kg. */
  public double kg(Gas gas) {
    return mol(gas) * gas.molarMass();
  }

  /** The same with some of one gas added, or taken where negative; never less than nothing. */
  public Inventory plus(Gas gas, double addedMol) {
    double[] other = mol.clone();
    other[gas.ordinal()] = Math.max(0, other[gas.ordinal()] + addedMol);
    return new Inventory(other);
  }

  /** A copy of the amounts, mol, in the order of {@link Gas}. */
  public double[] toArray() {
    return mol.clone();
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Inventory inventory && Arrays.equals(mol, inventory.mol);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(mol);
  }

  @Override
  public String toString() {
    StringBuilder text = new StringBuilder("Inventory[");
    for (Gas gas : Gas.all()) {
      if (mol(gas) != 0) {
        text.append(text.length() > 10 ? ", " : "").append(gas.symbol()).append(' ');
        text.append(mol(gas)).append(" mol");
      }
    }
    return text.append(']').toString();
  }
}

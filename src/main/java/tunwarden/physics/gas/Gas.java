package tunwarden.physics.gas;

import java.util.List;
import java.util.Optional;

/** The gases a headspace can hold. Molar masses from the IUPAC standard atomic weights. */
public enum Gas {
  CO2("CO2", 0.0440095),
  N2("N2", 0.0280134),
  O2("O2", 0.0319988),
  AR("Ar", 0.039948),
  HE("He", 0.004002602),
  NE("Ne", 0.0201797),
  KR("Kr", 0.083798),
  XE("Xe", 0.131293),
  H2("H2", 0.00201588),
  CO("CO", 0.0280101),
  H2S("H2S", 0.0340809),
  CH4("CH4", 0.0160425),
  C2H6("C2H6", 0.030069),
  SF6("SF6", 0.1460554);

  private static final List<Gas> ALL = List.of(values());

  private final String symbol;
  private final double molarMass;

  Gas(String symbol, double molarMass) {
    this.symbol = symbol;
    this.molarMass = molarMass;
  }

  /** Every gas, without the copy that {@code values()} makes. */
  public static List<Gas> all() {
    return ALL;
  }

  public String symbol() {
    return symbol;
  }

  /** kg/mol. */
  public double molarMass() {
    return molarMass;
  }

  /** The gas with that symbol, if known. */
  public static Optional<Gas> ofSymbol(String symbol) {
    for (Gas gas : ALL) {
      if (gas.symbol.equals(symbol)) {
        return Optional.of(gas);
      }
    }
    return Optional.empty();
  }
}

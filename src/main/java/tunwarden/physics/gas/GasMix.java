package tunwarden.physics.gas;

import java.util.Arrays;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import tunwarden.units.BadQuantityException;

/** Dry gas composition by mole fraction; immutable. */
public final class GasMix {
  /** Pure carbon dioxide. */
  public static final GasMix CO2 = pure(Gas.CO2);

  /** Dry air as N2, O2 and Ar (ISO 2533 composition, CO2 left out). */
  public static final GasMix AIR = of(new Gas[] {Gas.N2, Gas.O2, Gas.AR}, 78.084, 20.9476, 0.934);

  private static final Pattern PART = Pattern.compile("(\\d+(?:\\.\\d+)?)([A-Z][A-Za-z0-9]*)");
  private static final double PERCENT_SUM_TOLERANCE = 0.01;

  private final double[] fraction;

  private GasMix(double[] fraction) {
    this.fraction = fraction;
  }

  /** One gas alone. */
  public static GasMix pure(Gas gas) {
    return of(new Gas[] {gas}, 1);
  }

  /** Parts in any common unit of amount; they are scaled to sum to one. */
  public static GasMix of(Gas[] gases, double... parts) {
    double[] fraction = new double[Gas.values().length];
    double sum = Arrays.stream(parts).sum();
    if (gases.length != parts.length || !(sum > 0)) {
      throw new IllegalArgumentException("a gas mix needs a positive part for each gas");
    }
    for (int i = 0; i < gases.length; i++) {
      fraction[gases[i].ordinal()] += parts[i] / sum;
    }
    return new GasMix(fraction);
  }

  /** Mole fraction of the gas, 0..1. */
  public double fraction(Gas gas) {
    return fraction[gas.ordinal()];
  }

  /**
   * Reads {@code "CO2"} or a blend in per cent by volume, {@code "70N2/30CO2"}.
   *
   * @throws BadQuantityException when a gas is unknown or the shares do not make 100
   */
  public static GasMix parse(String text) {
    if (Gas.ofSymbol(text).isPresent()) {
      return pure(Gas.ofSymbol(text).get());
    }
    String[] parts = text.split("/");
    Gas[] gases = new Gas[parts.length];
    double[] shares = new double[parts.length];
    for (int i = 0; i < parts.length; i++) {
      Matcher matcher = PART.matcher(parts[i].trim());
      if (!matcher.matches()) {
        throw notAGas(text);
      }
      shares[i] = Double.parseDouble(matcher.group(1));
      gases[i] = Gas.ofSymbol(matcher.group(2)).orElseThrow(() -> notAGas(text));
    }
    double sum = Arrays.stream(shares).sum();
    if (Math.abs(sum - 100) > PERCENT_SUM_TOLERANCE) {
      throw new BadQuantityException(
          String.format(Locale.ROOT, "the shares of '%s' add up to %.4g, not 100", text, sum));
    }
    return of(gases, shares);
  }

  private static BadQuantityException notAGas(String text) {
    String known = Arrays.stream(Gas.values()).map(Gas::symbol).collect(Collectors.joining(", "));
    return new BadQuantityException(
        "'" + text + "' is not a gas; write one of " + known + " or a blend like 70N2/30CO2");
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof GasMix mix && Arrays.equals(fraction, mix.fraction);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(fraction);
  }

  /** As a person writes it: {@code CO2}, {@code 70N2/30CO2}. */
  @Override
  public String toString() {
    StringBuilder text = new StringBuilder();
    for (Gas gas : Gas.values()) {
      double share = fraction(gas);
      if (share == 1) {
        return gas.symbol();
      }
      if (share > 0) {
        text.append(text.isEmpty() ? "" : "/");
        String number = String.format(Locale.ROOT, "%.4f", 100 * share);
        text.append(number.replaceFirst("\\.?0+$", "")).append(gas.symbol());
      }
    }
    return text.toString();
  }
}

package tunwarden.physics.liquid;

import java.util.Map;
import java.util.OptionalDouble;

/**
 * A drink as its maker describes it.
 *
 * @param kind which drink
 * @param alcoholByVolume ethanol, share by volume 0..1; empty where not stated (the standard drink
 *     of that kind is then meant)
 * @param extractPlato real extract, degrees Plato; empty where not stated
 * @param sugarKgPerM3 sugar, kg/m³ (g/L); empty where not stated
 * @param beerMethod the trade relation used for beer
 * @param saltMolPerM3 dissolved salts by formula ("NaCl"), mol/m³; empty for none
 */
public record Liquid(
    LiquidKind kind,
    OptionalDouble alcoholByVolume,
    OptionalDouble extractPlato,
    OptionalDouble sugarKgPerM3,
    BeerMethod beerMethod,
    Map<String, Double> saltMolPerM3) {
  /** Plain water. */
  public static final Liquid WATER = of(LiquidKind.WATER);

  /** Keeps its own copy of the salts. */
  public Liquid {
    saltMolPerM3 = Map.copyOf(saltMolPerM3);
  }

  /** The standard drink of a kind. */
  public static Liquid of(LiquidKind kind) {
    return new Liquid(
        kind,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        BeerMethod.EUROPEAN,
        Map.of());
  }
}

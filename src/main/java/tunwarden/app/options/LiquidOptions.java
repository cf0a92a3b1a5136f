package tunwarden.app.options;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalDouble;
import picocli.CommandLine.Option;
import tunwarden.config.Texts;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;

/** The drink. */
public final class LiquidOptions {
  @Option(
      names = "--liquid",
      paramLabel = "KIND",
      converter = Convert.ToLiquidKind.class,
      description =
          "The drink: water, beer, wine, sparkling-wine, cider, soft-drink, mineral-water,"
              + " kombucha.")
  private LiquidKind kind;

  @Option(
      names = "--abv",
      paramLabel = "SHARE",
      converter = Convert.ToShare.class,
      description = "Alcohol by volume, as '5.2 %%'.")
  private Double alcohol;

  @Option(
      names = "--extract",
      paramLabel = "EXTRACT",
      converter = Convert.ToPlato.class,
      description = "Real extract, as '3.9 P' or '1.012 SG'.")
  private Double extractPlato;

  @Option(
      names = "--sugar",
      paramLabel = "CONTENT",
      converter = Convert.ToContent.class,
      description = "Sugar, as '100 g/L'.")
  private Double sugarKgPerM3;

  @Option(
      names = "--method",
      paramLabel = "METHOD",
      converter = Convert.ToBeerMethod.class,
      description = "Relation for beer: european or chart. Default: european.")
  private BeerMethod method;

  @Option(
      names = "--salt",
      paramLabel = "FORMULA=CONCENTRATION",
      description = "Dissolved salt, as NaCl=0.5mol/L; may be repeated.")
  private Map<String, String> salts;

  /** Whether any of these options was given. */
  public boolean areGiven() {
    return kind != null
        || alcohol != null
        || extractPlato != null
        || sugarKgPerM3 != null
        || method != null
        || salts != null;
  }

  /** Whether the drink is named. */
  public boolean isNamed() {
    return kind != null;
  }

  /**
   * Refuses to go on without a named drink.
   *
   * @throws BadInputException when none is named
   */
  public void requireKind() {
    if (kind == null) {
      throw new BadInputException(
          "--liquid is missing; name the drink, one of " + LiquidKind.words());
    }
  }

  /** The drink, water if none was named. */
  public Liquid liquid() {
    return new Liquid(
        kind == null ? LiquidKind.WATER : kind,
        optional(alcohol),
        optional(extractPlato),
        optional(sugarKgPerM3),
        method == null ? BeerMethod.EUROPEAN : method,
        saltMolPerM3());
  }

  private Map<String, Double> saltMolPerM3() {
    Map<String, Double> parsed = new LinkedHashMap<>();
    if (salts != null) {
      salts.forEach((name, text) -> parsed.put(name, Texts.of(Kind.MOLARITY).apply(text)));
    }
    return parsed;
  }

  private static OptionalDouble optional(Double value) {
    return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
  }
}

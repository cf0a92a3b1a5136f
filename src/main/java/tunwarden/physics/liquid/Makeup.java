package tunwarden.physics.liquid;

/**
 * What a liquid is made of as far as gas and density care, with the standard drink of its kind
 * filled in where the maker said nothing.
 *
 * @param alcoholByVolume ethanol, share by volume 0..1
 * @param solidsPlato dissolved extract or sugar, degrees Plato
 * @param sugarKgPerM3 the same as kg per m³ of liquid
 */
public record Makeup(double alcoholByVolume, double solidsPlato, double sugarKgPerM3) {
  /** Alcohol of the standard beer of the trade's charts: Speers and MacIntosh 2013, % by mass. */
  public static final double STANDARD_BEER_ALCOHOL_MASS_PERCENT = 4.22;

  /** Real extract of that beer, degrees Plato. */
  public static final double STANDARD_BEER_EXTRACT_PLATO = 5.78;

  private static final double ETHANOL_KG_PER_M3 = 789.24;
  private static final double STANDARD_BEER_ALCOHOL_BY_VOLUME = 0.054;

  /** The make-up of a liquid; the standard figures of wine, cider and the rest are estimates. */
  public static Makeup of(Liquid liquid) {
    Makeup standard =
        switch (liquid.kind()) {
          case WATER, MINERAL_WATER -> ofSugar(0, 0);
          case BEER -> ofPlato(STANDARD_BEER_ALCOHOL_BY_VOLUME, STANDARD_BEER_EXTRACT_PLATO);
          case WINE -> ofSugar(0.12, 2);
          case SPARKLING_WINE -> ofSugar(0.125, 10);
          case CIDER -> ofSugar(0.05, 20);
          case SOFT_DRINK -> ofSugar(0, 105);
          case KOMBUCHA -> ofSugar(0.005, 50);
        };
    double alcohol = liquid.alcoholByVolume().orElse(standard.alcoholByVolume);
    if (liquid.extractPlato().isPresent()) {
      return ofPlato(alcohol, liquid.extractPlato().getAsDouble());
    }
    return ofSugar(alcohol, liquid.sugarKgPerM3().orElse(standard.sugarKgPerM3));
  }

  /** Ethanol in per cent by mass. */
  public double alcoholMassPercent() {
    return 100 * alcoholByVolume * ETHANOL_KG_PER_M3 / kgPerM3At20C();
  }

  private double kgPerM3At20C() {
    return OimlR22.kgPerM3(OimlR22.massFraction(alcoholByVolume), OimlR22.REFERENCE_K)
        * SugarWater.gravityAt20C(solidsPlato);
  }

  private static Makeup ofPlato(double alcohol, double plato) {
    return new Makeup(alcohol, plato, SugarWater.sugarKgPerM3(plato));
  }

  private static Makeup ofSugar(double alcohol, double sugarKgPerM3) {
    return new Makeup(alcohol, SugarWater.plato(sugarKgPerM3), sugarKgPerM3);
  }
}

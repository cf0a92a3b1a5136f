package tunwarden.physics.solubility;

import java.util.ArrayList;
import java.util.List;
import tunwarden.physics.Correlation;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.liquid.Makeup;
import tunwarden.physics.liquid.WagnerPruss1993;

/**
 * Which relations fit a liquid: a factor on water for every gas, and for CO2 perhaps a relation.
 */
final class Drink {
  private static final double REFERENCE_K = 298.15;
  private static final double COMPOSITION_AT_K = 283.15;
  private static final double DOUBT_OF_SALT = 0.12; // 2.8 % rms where salt takes about a quarter
  private static final double DOUBT_OF_COMPOSITION = 0.5; // an estimate of an estimate
  private static final double LEAST_SOLIDS_KG_PER_M3 = 1e-6;

  private final LiquidKind kind;
  private final Makeup makeup;
  private final boolean composed;
  private final boolean salted;
  private final WeisenbergerSchumpe1996 salts;
  private final TradeRelation relation;
  private final double[] constantFactor = new double[Gas.all().size()];

  private Drink(Liquid liquid, TradeRelation relation) {
    this.kind = liquid.kind();
    this.makeup = Makeup.of(liquid);
    this.composed = liquid.alcoholByVolume().isPresent() || liquid.extractPlato().isPresent();
    this.salted = !liquid.saltMolPerM3().isEmpty();
    this.salts = WeisenbergerSchumpe1996.of(liquid.saltMolPerM3());
    this.relation = relation;
    for (Gas gas : Gas.all()) {
      boolean inRelation = gas == Gas.CO2 && relation != null;
      constantFactor[gas.ordinal()] =
          inRelation ? 1 : Composition.sugar(gas, makeup.sugarKgPerM3());
    }
  }

  private Drink(Drink other, double co2Factor) {
    this.kind = other.kind;
    this.makeup = other.makeup;
    this.composed = other.composed;
    this.salted = other.salted;
    this.salts = other.salts;
    this.relation = other.relation;
    System.arraycopy(other.constantFactor, 0, constantFactor, 0, constantFactor.length);
    constantFactor[Gas.CO2.ordinal()] *= co2Factor;
  }

  Drink scaled(double co2Factor) {
    return new Drink(this, co2Factor);
  }

  static Drink of(Liquid liquid) {
    Makeup makeup = Makeup.of(liquid);
    return new Drink(
        liquid,
        switch (liquid.kind()) {
          case BEER ->
              liquid.beerMethod() == BeerMethod.CHART ? new BeerChart() : new EuropeanBeer();
          case WINE, SPARKLING_WINE ->
              new EuWine(100 * makeup.alcoholByVolume(), makeup.sugarKgPerM3());
          case CIDER -> new CiderMean(makeup);
          case WATER, MINERAL_WATER, SOFT_DRINK, KOMBUCHA -> null;
        });
  }

  /** The trade's relation for CO2, or null where CO2 goes by water. */
  TradeRelation relation() {
    return relation;
  }

  /** What multiplies water's value, or the relation's. */
  double factor(Gas gas, double temperatureK) {
    double factor = constantFactor[gas.ordinal()];
    if (kind == LiquidKind.BEER && gas == Gas.CO2 && composed) {
      factor *= Composition.beerOverStandard(makeup, temperatureK);
    }
    return salted ? factor * salts.factor(gas, temperatureK) : factor;
  }

  /** The relation's own, and a share of each correction applied to it. */
  double relativeStandardUncertainty(Gas gas) {
    boolean corrected = kind == LiquidKind.BEER && gas == Gas.CO2 && composed;
    double composition = corrected ? 1 - Composition.beerOverStandard(makeup, COMPOSITION_AT_K) : 0;
    double ofSalt = DOUBT_OF_SALT * (1 - salts.factor(gas, REFERENCE_K));
    double ofComposition = DOUBT_OF_COMPOSITION * composition;
    double own = relationUncertainty(gas);
    return Math.sqrt(own * own + ofSalt * ofSalt + ofComposition * ofComposition);
  }

  private double relationUncertainty(Gas gas) {
    if (gas != Gas.CO2) {
      boolean water = kind == LiquidKind.WATER || kind == LiquidKind.MINERAL_WATER;
      double own = gas == Gas.N2 || gas == Gas.O2 ? 0.002 : 0.01;
      return water ? own : 0.025;
    }
    return switch (kind) {
      case WATER -> 0.0075;
      case MINERAL_WATER -> 0.008;
      case BEER, SOFT_DRINK -> 0.015;
      case SPARKLING_WINE -> 0.0175;
      case WINE, CIDER, KOMBUCHA -> 0.02;
    };
  }

  List<Correlation> correlations(Gas gas) {
    List<Correlation> list = new ArrayList<>();
    if (gas == Gas.CO2 && relation != null) {
      list.addAll(relation.correlations());
      if (kind == LiquidKind.BEER && composed) {
        list.add(Composition.ABOUT_BEER);
      }
    }
    list.add(
        switch (gas) {
          case CO2 -> Weiss1974.ABOUT;
          case O2 -> RettichFit.ABOUT_O2;
          case N2 -> RettichFit.ABOUT_N2;
          default -> IapwsG704.about(gas);
        });
    list.add(WagnerPruss1993.ABOUT);
    boolean sugared = gas != Gas.CO2 || relation == null;
    if (sugared && makeup.sugarKgPerM3() > LEAST_SOLIDS_KG_PER_M3) {
      list.add(Composition.ABOUT_SUGAR);
    }
    if (salted) {
      list.add(WeisenbergerSchumpe1996.ABOUT);
    }
    return list;
  }
}

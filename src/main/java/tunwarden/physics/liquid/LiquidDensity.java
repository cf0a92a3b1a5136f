package tunwarden.physics.liquid;

import java.util.List;
import tunwarden.physics.Correlation;

/**
 * Density of a drink with temperature: ethanol–water, times sugar–water over water. Dissolved gas
 * and pressure are left out (0.005 %/bar); salts are not counted. Immutable, does not allocate.
 */
public final class LiquidDensity {
  private final boolean alcoholic;
  private final double[] ethanolWater;
  private final SugarWater sugarWater;

  private LiquidDensity(Makeup makeup) {
    double ethanol = OimlR22.massFraction(makeup.alcoholByVolume());
    this.alcoholic = ethanol > 0;
    this.ethanolWater = OimlR22.mixture(ethanol);
    this.sugarWater = SugarWater.ofPlato(makeup.solidsPlato());
  }

  /** The density of a liquid, with the standard drink of its kind where nothing is stated. */
  public static LiquidDensity of(Liquid liquid) {
    return new LiquidDensity(Makeup.of(liquid));
  }

  /** kg/m³ at one atmosphere. */
  public double kgPerM3(double temperatureK) {
    double water = Kell1975.kgPerM3(temperatureK);
    double overWater = sugarWater.overWater(water, temperatureK);
    return overWater * (alcoholic ? OimlR22.kgPerM3(ethanolWater, temperatureK) : water);
  }

  /** The correlations behind it. */
  public List<Correlation> correlations() {
    return alcoholic
        ? List.of(Kell1975.ABOUT, SugarWater.ABOUT, OimlR22.ABOUT)
        : List.of(Kell1975.ABOUT, SugarWater.ABOUT);
  }
}

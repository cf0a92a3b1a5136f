package tunwarden.physics.liquid;

import java.util.List;
import tunwarden.physics.Correlation;

/**
 * Density of a drink with temperature: ethanol–water, times sugar–water over water. Dissolved gas
 * and pressure are left out (0.005 %/bar); salts are not counted. Immutable, does not allocate.
 */
public final class LiquidDensity {
  private final double ethanolMassFraction;
  private final double plato;

  private LiquidDensity(Makeup makeup) {
    this.ethanolMassFraction = OimlR22.massFraction(makeup.alcoholByVolume());
    this.plato = makeup.solidsPlato();
  }

  /** The density of a liquid, with the standard drink of its kind where nothing is stated. */
  public static LiquidDensity of(Liquid liquid) {
    return new LiquidDensity(Makeup.of(liquid));
  }

  /** kg/m³ at one atmosphere. */
  public double kgPerM3(double temperatureK) {
    double sugarWater = SugarWater.kgPerM3(plato, temperatureK);
    if (ethanolMassFraction == 0) {
      return sugarWater;
    }
    double ethanolWater = OimlR22.kgPerM3(ethanolMassFraction, temperatureK);
    return ethanolWater * sugarWater / Kell1975.kgPerM3(temperatureK);
  }

  /** The correlations behind it. */
  public List<Correlation> correlations() {
    return ethanolMassFraction == 0
        ? List.of(Kell1975.ABOUT, SugarWater.ABOUT)
        : List.of(Kell1975.ABOUT, SugarWater.ABOUT, OimlR22.ABOUT);
  }
}

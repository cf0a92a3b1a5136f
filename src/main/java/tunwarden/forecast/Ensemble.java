package tunwarden.forecast;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.vessel.Accuracy;

/**
 * A vessel as it probably is, and once for each uncertain thing moved to either end of its 95 %
 * range. The ends of a forecast are the quadrature sums of its moves up and down, kept apart: near
 * a full vessel they are far from equal. One thread at a time.
 *
 * <p>Dissolved gas is mostly inferred from pressure, so an error of the gauge or of the solubility
 * relation moves both, and largely cancels in a later pressure. It is therefore moved with them,
 * and only what its own uncertainty exceeds theirs by is moved alone. Where it is known better than
 * pressure could tell (a laboratory value) it stands by itself.
 */
public final class Ensemble {
  private static final double TILT_SHARE = 0.5;

  /** A trade relation is linear in pressure, the gas itself is not: 0.7 % per bar apart. */
  private static final double CURVE_PER_PA = 0.007 / 1e5;

  private static final Set<LiquidKind> BY_TRADE_RELATION =
      EnumSet.of(LiquidKind.BEER, LiquidKind.WINE, LiquidKind.SPARKLING_WINE, LiquidKind.CIDER);

  private static final double FULLEST = 0.999;
  private static final List<Unknown> IMPLYING =
      List.of(
          Unknown.GAUGE, Unknown.THERMOMETER, Unknown.ATMOSPHERE, Unknown.AIR, Unknown.RELATION);

  private final Present present;
  private final World middle;
  private final List<World> pairs = new ArrayList<>();

  private Ensemble(Present present, World middle) {
    this.present = present;
    this.middle = middle;
  }

  /** All worlds of a vessel. */
  public static Ensemble of(Present present) {
    double[] u95 = u95(present);
    World rest = world(present, Unknown.GAUGE, 0);
    if (present.dissolvedKgPerM3().isEmpty()) {
      Ensemble ensemble = new Ensemble(present, rest);
      ensemble.addPairs(rest, u95, 0, false);
      return ensemble;
    }
    Uncertain dissolved = present.dissolvedKgPerM3().get();
    double byPressure = impliedU95(present, rest, u95);
    boolean fixed = dissolved.u95() < byPressure;
    double squares = dissolved.u95() * dissolved.u95() - byPressure * byPressure;
    u95[Unknown.DISSOLVED.ordinal()] = fixed ? dissolved.u95() : Math.sqrt(squares);
    Ensemble ensemble = new Ensemble(present, rest.withDissolved(dissolved.value()));
    ensemble.addPairs(rest, u95, dissolved.value() - rest.dissolvedKgPerM3(), fixed);
    return ensemble;
  }

  /** How well pressure alone tells what the liquid holds at rest, 95 %, kg/m³. */
  private static double impliedU95(Present present, World rest, double[] u95) {
    double squares = 0;
    for (Unknown unknown : IMPLYING) {
      if (u95[unknown.ordinal()] > 0) {
        World moved = world(present, unknown, u95[unknown.ordinal()]);
        double by = moved.dissolvedKgPerM3() - rest.dissolvedKgPerM3();
        squares += by * by;
      }
    }
    return Math.sqrt(squares);
  }

  private void addPairs(World rest, double[] u95, double departure, boolean fixed) {
    for (Unknown unknown : Unknown.values()) {
      double size = u95[unknown.ordinal()];
      if (!(size > 0)) {
        continue;
      }
      boolean alone = unknown == Unknown.DISSOLVED;
      for (int sign = -1; sign <= 1; sign += 2) {
        World moved = alone ? rest : world(present, unknown, sign * size);
        double base = fixed ? rest.dissolvedKgPerM3() : moved.dissolvedKgPerM3();
        double own = alone ? sign * size : 0;
        boolean asItIs = departure == 0 && own == 0 && !fixed;
        pairs.add(asItIs ? moved : moved.withDissolved(base + departure + own));
      }
    }
  }

  private static double[] u95(Present present) {
    Accuracy accuracy = present.vessel().accuracy();
    LiquidSolubility solubility = LiquidSolubility.of(present.vessel().liquid());
    double relation = 2 * solubility.relativeStandardUncertainty(Gas.CO2);
    double[] u95 = new double[Unknown.values().length];
    u95[Unknown.GAUGE.ordinal()] = accuracy.pressureU95Pa();
    u95[Unknown.THERMOMETER.ordinal()] = accuracy.temperatureU95K();
    u95[Unknown.ATMOSPHERE.ordinal()] = present.vessel().site().ambientU95Pa();
    u95[Unknown.FILL.ordinal()] = accuracy.fillU95M3();
    u95[Unknown.AIR.ordinal()] = present.airPaAbsolute().u95();
    u95[Unknown.RELATION.ordinal()] = relation;
    u95[Unknown.RELATION_SLOPE.ordinal()] = TILT_SHARE * relation;
    boolean trade = BY_TRADE_RELATION.contains(present.vessel().liquid().kind());
    u95[Unknown.RELATION_CURVE.ordinal()] = trade ? CURVE_PER_PA : 0;
    u95[Unknown.VENT_COOLING.ordinal()] = 1;
    return u95;
  }

  /** The vessel at rest with one thing moved; letting gas out can only cool what stays. */
  private static World world(Present present, Unknown moved, double by) {
    double fill = present.vessel().fillM3() + (moved == Unknown.FILL ? by : 0);
    double most = Math.max(FULLEST * present.vessel().volumeM3(), present.vessel().fillM3());
    World.Setting setting =
        new World.Setting(
            present,
            Math.max(0, Math.min(most, fill)),
            present.temperatureK() + (moved == Unknown.THERMOMETER ? by : 0),
            present.vessel().site().ambientPaAbsolute() + (moved == Unknown.ATMOSPHERE ? by : 0),
            1 + (moved == Unknown.RELATION ? by : 0),
            moved == Unknown.RELATION_SLOPE ? by : 0,
            moved == Unknown.RELATION_CURVE ? by : 0,
            moved == Unknown.VENT_COOLING ? Math.max(0, by) : 0);
    double gauge = present.pressurePaGauge() + (moved == Unknown.GAUGE ? by : 0);
    double air = present.airPaAbsolute().value() + (moved == Unknown.AIR ? by : 0);
    return World.atRest(setting, gauge + setting.ambientPa(), Math.max(0, air));
  }

  /** Where it started. */
  public Present present() {
    return present;
  }

  /** The most likely world. */
  public World middle() {
    return middle;
  }

  /** One forecast with its 95 % range. */
  public Spread range(ToDoubleFunction<World> forecast) {
    return ranges(world -> new double[] {forecast.applyAsDouble(world)})[0];
  }

  /** Several forecasts with their 95 % ranges, each world asked once. */
  public Spread[] ranges(Function<World, double[]> forecasts) {
    double[] centre = forecasts.apply(middle);
    double[] up = new double[centre.length];
    double[] down = new double[centre.length];
    for (int i = 0; i < pairs.size(); i += 2) {
      double[] low = forecasts.apply(pairs.get(i));
      double[] high = forecasts.apply(pairs.get(i + 1));
      for (int k = 0; k < centre.length; k++) {
        double rise = Math.max(0, Math.max(low[k], high[k]) - centre[k]);
        double fall = Math.max(0, centre[k] - Math.min(low[k], high[k]));
        up[k] += rise * rise;
        down[k] += fall * fall;
      }
    }
    Spread[] spreads = new Spread[centre.length];
    for (int k = 0; k < centre.length; k++) {
      spreads[k] =
          new Spread(centre[k] - Math.sqrt(down[k]), centre[k], centre[k] + Math.sqrt(up[k]));
    }
    return spreads;
  }
}

package tunwarden.physics.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tunwarden.physics.Correlation;
import tunwarden.physics.closed.ClosedState;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.closed.Inventory;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.Weiss1974Virial;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.physics.uncertainty.LinearPropagation;
import tunwarden.physics.uncertainty.Propagated;
import tunwarden.units.Constants;

/**
 * Answers about a closed vessel that is at equilibrium now and will be again at another
 * temperature, with first-order 95 % uncertainty. An error of the solubility relation is taken to
 * be the same at both temperatures, plus an independent one of its course with temperature that has
 * grown to the same size over 20 K (a working estimate).
 */
public final class Warming {
  /** Coldest end temperature offered, K. */
  public static final double LEAST_K = Constants.ZERO_CELSIUS_K - 2;

  /** Warmest end temperature offered, K. */
  public static final double MOST_K = Constants.ZERO_CELSIUS_K + 60;

  private static final double COURSE_SPAN_K = 20;
  private static final int GAUGE = 0;
  private static final int TEMPERATURE = 1;
  private static final int AMBIENT = 2;
  private static final int AIR = 3;
  private static final int FILL = 4;
  private static final int RELATION = 5;
  private static final int COURSE = 6;

  private final double volumeM3;
  private final double fillM3;
  private final Liquid liquid;
  private final GasMix gas;
  private final LiquidSolubility solubility;

  private Warming(double volumeM3, double fillM3, Liquid liquid, GasMix gas) {
    this.volumeM3 = volumeM3;
    this.fillM3 = fillM3;
    this.liquid = liquid;
    this.gas = gas;
    this.solubility = LiquidSolubility.of(liquid);
  }

  /**
   * A vessel closed with this fill.
   *
   * @param volumeM3 gross volume, m³
   * @param fillM3 liquid at the present temperature, m³
   * @param liquid the drink
   * @param gas the purge gas
   */
  public static Warming of(double volumeM3, double fillM3, Liquid liquid, GasMix gas) {
    return new Warming(volumeM3, fillM3, liquid, gas);
  }

  /**
   * Pressure at another temperature, Pa gauge; negative where a vacuum forms. Where the vessel is
   * not full but might be, within the doubt of the fill, the interval leaves the squeeze of a full
   * vessel out and a remark tells of it.
   */
  public Answer pressurePaGauge(GaugeState now, double toK, Doubt doubt) {
    boolean usable = now.unusable().isEmpty() && Double.isFinite(toK);
    boolean full = usable && settled(values(now), toK).liquidFull();
    return answer(
        now,
        toK,
        doubt,
        x -> {
          ClosedState then = settled(x, toK);
          return (full ? then.totalPaAbsolute() : then.gasPaAbsolute()) - x[AMBIENT];
        });
  }

  /** CO2 left dissolved at another temperature, kg/m³ of liquid (g/L). */
  public Answer dissolvedKgPerM3(GaugeState now, double toK, Doubt doubt) {
    return answer(now, toK, doubt, x -> settled(x, toK).dissolvedCo2KgPerM3());
  }

  /**
   * Temperature, K, at which the closed vessel reaches a gauge pressure; empty, with the reason,
   * when that is outside −2..60 °C.
   */
  public Answer temperatureK(GaugeState now, double paGauge, Doubt doubt) {
    Optional<String> reason = now.unusable();
    if (reason.isPresent() || !Double.isFinite(paGauge)) {
      return Answer.none(model(), reason.orElse("the pressure asked for is not a number"));
    }
    double[] x = values(now);
    if (pressure(x, MOST_K) < paGauge) {
      return Answer.none(model(), "the vessel stays below that pressure up to 60 C");
    }
    if (pressure(x, LEAST_K) > paGauge) {
      return Answer.none(model(), "the vessel is above that pressure even at -2 C");
    }
    double found = crossing(x, paGauge);
    return answer(now, found, doubt, y -> crossing(y, paGauge));
  }

  /** The correlations used. */
  public String model() {
    String volumes =
        Stream.concat(
                Stream.of(Weiss1974Virial.ABOUT), LiquidDensity.of(liquid).correlations().stream())
            .map(Correlation::name)
            .collect(Collectors.joining(", "));
    return solubility.model(Gas.CO2) + ", " + volumes + "; closed rigid vessel";
  }

  private Answer answer(
      GaugeState now, double toK, Doubt doubt, ToDoubleFunction<double[]> function) {
    Optional<String> reason = now.unusable();
    if (reason.isPresent() || !Double.isFinite(toK)) {
      return Answer.none(model(), reason.orElse("the end temperature is not a number"));
    }
    double relation = solubility.relativeStandardUncertainty(Gas.CO2);
    double course = relation * Math.min(1, Math.abs(toK - now.temperatureK()) / COURSE_SPAN_K);
    double[] standard = {
      doubt.gaugePa(),
      doubt.temperatureK(),
      doubt.ambientPa(),
      doubt.airPa(),
      doubt.fillM3(),
      relation,
      course
    };
    Propagated result = LinearPropagation.independent(values(now), standard).through(function);
    return new Answer(
        OptionalDouble.of(result.value()), result.u95(), model(), remarks(now, toK, doubt));
  }

  private List<String> remarks(GaugeState now, double toK, Doubt doubt) {
    List<String> remarks =
        new ArrayList<>(solubility.breaches(Gas.CO2, now.paAbsolute(), now.temperatureK()));
    ClosedState then = settled(values(now), toK);
    for (String sentence : solubility.breaches(Gas.CO2, then.totalPaAbsolute(), toK)) {
      if (!remarks.contains(sentence)) {
        remarks.add(sentence);
      }
    }
    if (then.liquidFull()) {
      remarks.add(
          "the liquid fills the whole vessel there; the pressure is that of a rigid shell, and any"
              + " further warming raises it by bars per degree");
    } else if (fullest(now, doubt).liquidM3(toK) >= volumeM3) {
      remarks.add(
          "the fill is not known well enough: within its doubt the liquid may fill the whole vessel"
              + " there, and then the pressure rises by bars per degree");
    }
    return remarks;
  }

  private ClosedVessel fullest(GaugeState now, Doubt doubt) {
    double fill = fillM3 + LinearPropagation.COVERAGE_95 * doubt.fillM3();
    return new ClosedVessel(volumeM3, Math.min(volumeM3, fill), now.temperatureK(), liquid);
  }

  private double[] values(GaugeState now) {
    return new double[] {
      now.paGauge(), now.temperatureK(), now.ambientPaAbsolute(), now.airPaAbsolute(), fillM3, 1, 1
    };
  }

  private double pressure(double[] x, double toK) {
    return settled(x, toK).totalPaAbsolute() - x[AMBIENT];
  }

  private ClosedState settled(double[] x, double toK) {
    double fill = Math.max(0, Math.min(volumeM3, x[FILL]));
    ClosedVessel plain = new ClosedVessel(volumeM3, fill, x[TEMPERATURE], liquid);
    ClosedVessel before = plain.withSolubility(solubility.scaled(x[RELATION]));
    ClosedVessel after = plain.withSolubility(solubility.scaled(x[RELATION] * x[COURSE]));
    Inventory held = before.inventoryAt(x[GAUGE] + x[AMBIENT], x[TEMPERATURE], gas, x[AIR]);
    return after.settle(held, toK);
  }

  /** Bisection over −2..60 °C; the pressure rises with temperature throughout. */
  private double crossing(double[] x, double paGauge) {
    double low = LEAST_K;
    double high = MOST_K;
    for (int i = 0; i < 50; i++) {
      double middle = (low + high) / 2;
      if (pressure(x, middle) < paGauge) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }
}

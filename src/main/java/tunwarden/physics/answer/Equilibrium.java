package tunwarden.physics.answer;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.HeadspaceShares;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.physics.uncertainty.LinearPropagation;
import tunwarden.physics.uncertainty.Propagated;

/**
 * Answers about a headspace and a liquid that have come to equilibrium, with first-order (JCGM 100)
 * 95 % uncertainty from gauge, thermometer, barometer, left-over air and the relation itself.
 */
public final class Equilibrium {
  /** Said with every answer of this kind. */
  public static final String CAUTION =
      "true only at equilibrium: a vessel left still needs days to weeks to get there";

  private static final int GAUGE = 0;
  private static final int TEMPERATURE = 1;
  private static final int AMBIENT = 2;
  private static final int AIR = 3;
  private static final int RELATION = 4;

  private final LiquidSolubility solubility;
  private final GasMix gas;

  private Equilibrium(LiquidSolubility solubility, GasMix gas) {
    this.solubility = solubility;
    this.gas = gas;
  }

  /** A liquid under a gas. */
  public static Equilibrium of(Liquid liquid, GasMix gas) {
    return new Equilibrium(LiquidSolubility.of(liquid), gas);
  }

  /** Dissolved amount of one gas, kg/m³ of liquid (g/L). */
  public Answer dissolved(Gas which, GaugeState state, Doubt doubt) {
    return answer(
        which,
        state,
        doubt,
        x -> {
          double total = x[GAUGE] + x[AMBIENT];
          double partial = partialPa(which, total, x[TEMPERATURE], x[AIR]);
          return x[RELATION] * solubility.dissolvedKgPerM3(which, partial, total, x[TEMPERATURE]);
        });
  }

  /** Partial pressure of one gas, Pa. */
  public Answer partialPressure(Gas which, GaugeState state, Doubt doubt) {
    return answer(
        which, state, doubt, x -> partialPa(which, x[GAUGE] + x[AMBIENT], x[TEMPERATURE], x[AIR]));
  }

  /**
   * Gauge pressure, Pa, to hold for a wanted amount of CO2 at equilibrium. The gauge pressure of
   * the state is not used.
   *
   * @param dissolvedKgPerM3 wanted CO2, kg/m³ of liquid
   */
  public Answer hold(double dissolvedKgPerM3, GaugeState state, Doubt doubt) {
    if (!(dissolvedKgPerM3 >= 0) || !Double.isFinite(dissolvedKgPerM3)) {
      return Answer.none(model(Gas.CO2), "the wanted amount of CO2 is not a number from zero up");
    }
    if (!(gas.fraction(Gas.CO2) > 0)) {
      return Answer.none(model(Gas.CO2), "the gas " + gas + " holds no CO2 to dissolve");
    }
    GaugeState start =
        new GaugeState(0, state.temperatureK(), state.ambientPaAbsolute(), state.airPaAbsolute());
    Answer answer =
        answer(
            Gas.CO2,
            start,
            doubt,
            x ->
                x[GAUGE]
                    + holdPa(dissolvedKgPerM3 / x[RELATION], x[TEMPERATURE], x[AIR])
                    - x[AMBIENT]);
    if (answer.value().isEmpty()) {
      return answer;
    }
    double total = answer.value().getAsDouble() + state.ambientPaAbsolute();
    return answer.with(solubility.breaches(Gas.CO2, total, state.temperatureK()));
  }

  /** The correlations behind an answer about one gas. */
  public String model(Gas which) {
    return solubility.model(which);
  }

  private Answer answer(
      Gas which, GaugeState state, Doubt doubt, ToDoubleFunction<double[]> function) {
    Optional<String> reason = state.unusable();
    if (reason.isPresent()) {
      return Answer.none(model(which), reason.get());
    }
    double[] value = {
      state.paGauge(), state.temperatureK(), state.ambientPaAbsolute(), state.airPaAbsolute(), 1
    };
    double[] standard = {
      doubt.gaugePa(),
      doubt.temperatureK(),
      doubt.ambientPa(),
      doubt.airPa(),
      solubility.relativeStandardUncertainty(which)
    };
    Propagated result = LinearPropagation.independent(value, standard).through(function);
    return new Answer(
        OptionalDouble.of(result.value()),
        result.u95(),
        model(which),
        solubility.breaches(which, state.paAbsolute(), state.temperatureK()));
  }

  private double partialPa(Gas which, double total, double temperatureK, double air) {
    double dry = total - solubility.vapourPressurePa(temperatureK);
    return HeadspaceShares.partialPa(which, gas, dry, air);
  }

  /**
   * Total pressure, Pa absolute, that holds an amount: partial pressure and total found in turn.
   */
  private double holdPa(double dissolvedKgPerM3, double temperatureK, double air) {
    double share = gas.fraction(Gas.CO2);
    double other = Math.max(0, air) + solubility.vapourPressurePa(temperatureK);
    double total = other + 2e5;
    for (int i = 0; i < 60; i++) {
      double partial = solubility.partialPa(Gas.CO2, dissolvedKgPerM3, total, temperatureK);
      double next = partial / share + other;
      if (Math.abs(next - total) < 1e-9 * next) {
        return next;
      }
      total = next;
    }
    return total;
  }
}

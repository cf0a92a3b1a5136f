package tunwarden.physics.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.uncertainty.LinearPropagation;
import tunwarden.physics.uncertainty.Propagated;

/** Answers about gas through an orifice, with first-order 95 % uncertainty. */
public final class OrificeFlow {
  /** The correlations used, in words. */
  public static final String MODEL =
      "ideal isentropic nozzle with real compressibility, as API 520 and ISO 4126";

  /**
   * Relative standard uncertainty of the nozzle relation itself, the coefficient taken as given.
   */
  private static final double RELATION = 0.005;

  private static final double TRIED_TO_PA = 12e5;

  private OrificeFlow() {}

  /**
   * Mass flow, kg/s.
   *
   * @param orifice where it flows through
   * @param gas what flows
   * @param inlet the state upstream; its left-over air is not used
   * @param toPaAbsolute back pressure, Pa absolute
   * @param doubt gauge, thermometer and barometer count
   */
  public static Answer kgPerS(
      IsentropicOrifice orifice, GasMix gas, GaugeState inlet, double toPaAbsolute, Doubt doubt) {
    if (inlet.unusable().isPresent()) {
      return Answer.none(MODEL, inlet.unusable().get());
    }
    if (!(toPaAbsolute >= 0) || !Double.isFinite(toPaAbsolute)) {
      return Answer.none(MODEL, "the back pressure is not a number from a perfect vacuum up");
    }
    double[] value = {inlet.paGauge(), inlet.temperatureK(), inlet.ambientPaAbsolute(), 1};
    double[] standard = {doubt.gaugePa(), doubt.temperatureK(), doubt.ambientPa(), RELATION};
    Propagated result =
        LinearPropagation.independent(value, standard)
            .through(x -> x[3] * orifice.kgPerS(gas, x[0] + x[2], toPaAbsolute, x[1]));
    List<String> remarks = new ArrayList<>();
    if (inlet.paAbsolute() > TRIED_TO_PA) {
      remarks.add("the nozzle relation was compared with a real-gas integration to 11 bar only");
    }
    if (inlet.paAbsolute() <= toPaAbsolute) {
      remarks.add("the pressure behind the orifice is not below the pressure in front of it");
    }
    return new Answer(OptionalDouble.of(result.value()), result.u95(), MODEL, remarks);
  }
}

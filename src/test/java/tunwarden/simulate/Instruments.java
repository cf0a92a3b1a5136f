package tunwarden.simulate;

import java.util.Random;

/**
 * A gauge and a thermometer with constant errors, noise and steps, and a weather that the gauge
 * feels because it counts from the room's air.
 */
record Instruments(
    double gaugeBiasPa,
    double gaugeNoisePa,
    double gaugeStepPa,
    double thermometerBiasK,
    double thermometerNoiseK,
    double thermometerStepK,
    double weatherPa,
    double weatherPhase) {

  static Instruments draw(Random random, double gaugeU95Pa, double thermometerU95K) {
    double[] steps = {1, 10, 100, 100, 1000};
    double[] temperatureSteps = {0.001, 0.01, 0.1};
    return new Instruments(
        random.nextGaussian() * gaugeU95Pa / 2,
        50 * Math.pow(10, random.nextDouble()),
        steps[random.nextInt(steps.length)],
        random.nextGaussian() * thermometerU95K / 2,
        0.01 + 0.05 * random.nextDouble(),
        temperatureSteps[random.nextInt(temperatureSteps.length)],
        400 * random.nextDouble(),
        6 * random.nextDouble());
  }

  double pressure(double truePaGauge, Random random) {
    double value = truePaGauge + gaugeBiasPa + gaugeNoisePa * random.nextGaussian();
    return Math.rint(value / gaugeStepPa) * gaugeStepPa;
  }

  double temperature(double trueK, Random random) {
    double value = trueK + thermometerBiasK + thermometerNoiseK * random.nextGaussian();
    return 273.15 + Math.rint((value - 273.15) / thermometerStepK) * thermometerStepK;
  }

  /** Departure of the room's air from its mean, Pa, over some three days. */
  double weather(double seconds) {
    return weatherPa * Math.sin(weatherPhase + seconds * 2.4e-5);
  }
}

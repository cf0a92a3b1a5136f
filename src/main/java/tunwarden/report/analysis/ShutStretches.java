package tunwarden.report.analysis;

import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.Constants;
import tunwarden.vessel.Vessel;

/**
 * The stretches of a log in which the vessel was shut and its headspace changed: what the headspace
 * gained there, the liquid lost. A history of the liquid is weighed by that balance.
 */
final class ShutStretches {
  private static final int POINTS = 12;
  private static final int LEAST_BINS = 6;

  /** Share of a gain that gas law and relation may be off by, beside the fill. */
  private static final double LOOSE = 0.05;

  private static final double NOISE_PA = 60;
  private static final double TELLING = 12;

  private final double[] headspaceKgPerM3;
  private final double[] restKgPerM3;
  private double noiseKgPerM3;
  private double looseShare;
  private final List<int[]> stretches = new ArrayList<>();

  private ShutStretches(int bins) {
    headspaceKgPerM3 = new double[bins];
    restKgPerM3 = new double[bins];
  }

  static ShutStretches of(Analysis analysis) {
    Bins bins = analysis.bins();
    Vessel vessel = analysis.vessel();
    LiquidSolubility solubility = LiquidSolubility.of(vessel.liquid());
    LiquidDensity density = LiquidDensity.of(vessel.liquid());
    ShutStretches shut = new ShutStretches(bins.size());
    double fillDensity = 0;
    double perPa = 0;
    double roomM3 = 0;
    for (int i = 0; i < bins.size(); i++) {
      double kelvin = bins.temperatureK(i);
      double gauge = bins.pressurePa(i);
      if (Double.isNaN(kelvin) || Double.isNaN(gauge)) {
        shut.headspaceKgPerM3[i] = Double.NaN;
        shut.restKgPerM3[i] = Double.NaN;
        continue;
      }
      fillDensity = fillDensity == 0 ? density.kgPerM3(kelvin) : fillDensity;
      double total = gauge + vessel.site().ambientPaAbsolute();
      double air = vessel.contents().airPaAbsolute();
      double partial = Math.max(0, total - solubility.vapourPressurePa(kelvin) - air);
      double liquidM3 = vessel.fillM3() * fillDensity / density.kgPerM3(kelvin);
      roomM3 = Math.max(1e-4 * vessel.volumeM3(), vessel.volumeM3() - liquidM3);
      perPa = roomM3 * kgPerM3Pa(total, kelvin) / vessel.fillM3();
      shut.headspaceKgPerM3[i] = partial * perPa;
      shut.restKgPerM3[i] = solubility.dissolvedKgPerM3(Gas.CO2, partial, total, kelvin);
    }
    double noisePa = Math.max(NOISE_PA, analysis.signals().pressureNoisePa() / 2);
    shut.noiseKgPerM3 = noisePa * perPa;
    shut.looseShare = Math.hypot(LOOSE, vessel.accuracy().fillU95M3() / 1.96 / roomM3);
    shut.find(analysis);
    return shut;
  }

  private static double kgPerM3Pa(double totalPa, double kelvin) {
    double z = RealGas.z(Gas.CO2, totalPa, kelvin);
    return Gas.CO2.molarMass() / (z * Constants.GAS_CONSTANT * kelvin);
  }

  /** What the liquid would hold at rest, with the air stated for the vessel; NaN where unknown. */
  double rest(int bin) {
    return restKgPerM3[bin];
  }

  private void find(Analysis analysis) {
    Bins bins = analysis.bins();
    int from = -1;
    for (int i = 0; i <= bins.size(); i++) {
      boolean in =
          i < bins.size()
              && bins.isSealed(i)
              && !Double.isNaN(headspaceKgPerM3[i])
              && !isDisturbed(analysis, i);
      if (in && from < 0) {
        from = i;
      } else if (!in && from >= 0) {
        keep(from, i - 1);
        from = -1;
      }
    }
  }

  private static boolean isDisturbed(Analysis analysis, int bin) {
    long from = analysis.bins().middleMs(bin) - 2 * analysis.bins().widthMs();
    long until = analysis.bins().middleMs(bin) + analysis.bins().widthMs();
    for (Event event : analysis.events()) {
      boolean gas = event.gasKg() != 0;
      if (gas && event.until().toEpochMilli() >= from && event.time().toEpochMilli() <= until) {
        return true;
      }
    }
    return false;
  }

  /** Where nothing changed, shut and held look alike: such a stretch says nothing. */
  private void keep(int from, int to) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    for (int i = from; i <= to; i++) {
      least = Math.min(least, headspaceKgPerM3[i]);
      most = Math.max(most, headspaceKgPerM3[i]);
    }
    if (to - from >= LEAST_BINS && most - least > TELLING * noiseKgPerM3) {
      stretches.add(new int[] {from, to});
    }
  }

  boolean isEmpty() {
    return stretches.isEmpty();
  }

  /** Log-likelihood of a history of the liquid, kg/m³ by stretch of time. */
  double fit(double[] dissolved) {
    double log = 0;
    for (int[] stretch : stretches) {
      int from = stretch[0];
      double range = 0;
      for (int n = 1; n <= POINTS; n++) {
        int i = from + (stretch[1] - from) * n / POINTS;
        range = Math.max(range, Math.abs(headspaceKgPerM3[i] - headspaceKgPerM3[from]));
      }
      double sigma = Math.hypot(looseShare * range, 2 * noiseKgPerM3);
      for (int n = 1; n <= POINTS; n++) {
        int i = from + (stretch[1] - from) * n / POINTS;
        double gained = headspaceKgPerM3[i] - headspaceKgPerM3[from];
        double off = (dissolved[i] - dissolved[from] + gained) / sigma;
        log -= off * off / 2 / POINTS; // points of one course share their errors: one piece of news
      }
    }
    return log;
  }
}

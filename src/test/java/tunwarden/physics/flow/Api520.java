package tunwarden.physics.flow;

/**
 * Orifice area by API Std 520 Part I, SI and US forms, with its own rounded constants: written
 * apart from the program's nozzle so that the two can be compared.
 */
final class Api520 {
  private Api520() {}

  /** Critical flow, SI: mm² from kg/h, kPa, K, kg/kmol. */
  static double criticalMm2(double kgPerH, double k, double kd, double kPa, double zTOverM) {
    double c = 0.03948 * Math.sqrt(k * Math.pow(2 / (k + 1), (k + 1) / (k - 1)));
    return kgPerH / (c * kd * kPa) * Math.sqrt(zTOverM);
  }

  /** Critical flow, US: in² from lb/h, psia, °R, with C = 520 rounded to a whole number. */
  static double criticalIn2(double lbPerH, double k, double kd, double psia, double zTOverM) {
    double c = Math.rint(520 * Math.sqrt(k * Math.pow(2 / (k + 1), (k + 1) / (k - 1))));
    return lbPerH / (c * kd * psia) * Math.sqrt(zTOverM);
  }

  /** Subcritical factor F2. */
  static double f2(double k, double ratio) {
    double expansion = (1 - Math.pow(ratio, (k - 1) / k)) / (1 - ratio);
    return Math.sqrt(k / (k - 1) * Math.pow(ratio, 2 / k) * expansion);
  }

  /** Subcritical flow, SI: mm². */
  static double subcriticalMm2(
      double kgPerH, double f2, double kd, double kPa, double backKPa, double zTOverM) {
    return 17.9 * kgPerH / (f2 * kd) * Math.sqrt(zTOverM / (kPa * (kPa - backKPa)));
  }

  /** Subcritical flow, US: in². */
  static double subcriticalIn2(
      double lbPerH, double f2, double kd, double psia, double backPsia, double zTOverM) {
    return lbPerH / (735 * f2 * kd) * Math.sqrt(zTOverM / (psia * (psia - backPsia)));
  }

  /** ISO 4126-7 mass flow, kg/h from mm², bar absolute; structure from memory. */
  static double iso4126KgPerH(double mm2, double kdr, double bar, double k, double mOverZT) {
    double c = 3.948 * Math.sqrt(k * Math.pow(2 / (k + 1), (k + 1) / (k - 1)));
    return mm2 * kdr * bar * c * Math.sqrt(mOverZT);
  }
}

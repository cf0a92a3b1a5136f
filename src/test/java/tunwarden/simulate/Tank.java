package tunwarden.simulate;

/**
 * A vessel integrated by the midpoint rule in steps of a second, or of a fiftieth while a valve
 * passes gas. Masses in kg, the air in mol.
 */
final class Tank {
  private static final double ADIABATIC = 1.3;
  private static final double CRITICAL_RATIO = 0.5457;

  /** What stays the same while the tank lives. */
  record Build(
      double volumeM3, double fillM3, TrueLiquid liquid, double gasTimeS, double fillAtK) {}

  private final Build build;
  private double liquidKg;
  private double gasKg;
  private double airMol;
  private double chillK;

  double temperatureK;
  double ambientPa = 101_325;
  double transferPerS;
  double madeKgPerM3PerS;
  double leakKgPerS;

  /** Open flow path to the room, effective area in m2; 0 when shut. */
  double ventAreaM2;

  /** Regulated supply level, Pa gauge; NaN when shut. */
  double supplyPaGauge = Double.NaN;

  /** Back-pressure level, Pa gauge; NaN when not fitted. */
  double spundingPaGauge = Double.NaN;

  /** Relief valve: opening and reseating, Pa gauge, and effective area. */
  double reliefOpensPaGauge = Double.POSITIVE_INFINITY;

  double reliefShutsPaGauge;
  double reliefAreaM2;
  boolean reliefOpen;

  /** Gas passed out through the relief valve since the counter was last cleared, kg. */
  double liftedKg;

  private double lifting;

  /** Gas passed out (positive) or in, kg of CO2, since the counter was last cleared. */
  double passedKg;

  Tank(Build build, double temperatureK, double transferPerS) {
    this.build = build;
    this.temperatureK = temperatureK;
    this.transferPerS = transferPerS;
  }

  /** Sets the headspace to a gauge pressure with some air in it, and the liquid's content. */
  void fill(double paGauge, double airPa, double shareOfEquilibrium) {
    double v = headspaceM3();
    double rt = TrueLiquid.GAS_CONSTANT * temperatureK;
    airMol = airPa * v / rt;
    double partial = paGauge + ambientPa - airPa - TrueLiquid.vapour(temperatureK);
    double b = TrueLiquid.virial(temperatureK);
    double density = partial / rt;
    for (int i = 0; i < 20; i++) {
      density = partial / (rt * (1 + b * density));
    }
    gasKg = density * v * TrueLiquid.CO2_KG_PER_MOL;
    liquidKg = shareOfEquilibrium * equilibrium() * build.fillM3;
  }

  double headspaceM3() {
    double swell =
        TrueLiquid.relativeDensity(build.fillAtK) / TrueLiquid.relativeDensity(temperatureK);
    return build.volumeM3 - build.fillM3 * swell;
  }

  double dissolved() {
    return liquidKg / build.fillM3;
  }

  double totalKg() {
    return liquidKg + gasKg;
  }

  double airFraction() {
    double mol = gasKg / TrueLiquid.CO2_KG_PER_MOL;
    return airMol / (airMol + mol);
  }

  double equilibrium() {
    return equilibrium(gasKg);
  }

  private double equilibrium(double kg) {
    double total = pressure(kg);
    return build.liquid.equilibrium(temperatureK, partial(kg), total);
  }

  double pressurePaGauge() {
    return pressure(gasKg) - ambientPa;
  }

  private double partial(double kg) {
    double density = kg / TrueLiquid.CO2_KG_PER_MOL / headspaceM3();
    double rt = TrueLiquid.GAS_CONSTANT * (temperatureK - chillK);
    return density * rt * (1 + TrueLiquid.virial(temperatureK) * density);
  }

  private double pressure(double kg) {
    double air = airMol * TrueLiquid.GAS_CONSTANT * (temperatureK - chillK) / headspaceM3();
    return partial(kg) + air + TrueLiquid.vapour(temperatureK);
  }

  /** Lets time pass. */
  void run(double seconds) {
    double left = seconds;
    while (left > 1e-9) {
      double gauge = pressurePaGauge();
      reliefOpen = gauge > (reliefOpen ? reliefShutsPaGauge : reliefOpensPaGauge);
      double dt = Math.min(left, step(gauge));
      advance(dt);
      left -= dt;
    }
  }

  /** Short while a valve blows, a second on a regulator, else a tenth of the transfer time. */
  private double step(double gauge) {
    if (reliefOpen || (ventAreaM2 > 0 && gauge > 100)) {
      return 0.02;
    }
    boolean regulated = supplyPaGauge > -1e9 || spundingPaGauge > -1e9 || ventAreaM2 > 0;
    double ratio = equilibrium() * build.fillM3 / gasKg;
    return Math.min(regulated ? 1 : 5, 0.1 / (transferPerS * (1 + ratio)));
  }

  private void advance(double dt) {
    double half = gasKg + release(gasKg, liquidKg) * dt / 2;
    double made = madeKgPerM3PerS * build.fillM3;
    double middleLiquid = liquidKg + (made - release(gasKg, liquidKg)) * dt / 2;
    double flow = release(half, middleLiquid);
    liquidKg += (made - flow) * dt;
    gasKg += flow * dt;
    double out = outflow() + leakKgPerS;
    double above = gasKg * Math.max(pressurePaGauge(), 0) / (pressurePaGauge() + ambientPa);
    liftedKg += lifting * dt;
    pass(Math.min(out * dt, out > 0 && leakKgPerS == 0 ? above : 0.2 * gasKg));
    chillK -= chillK * dt / build.gasTimeS;
  }

  private double release(double gas, double liquid) {
    return transferPerS * (liquid - equilibrium(gas) * build.fillM3);
  }

  /** Moves CO2 out (with its share of air) or in (pure), and cools or warms what remains. */
  private void pass(double kg) {
    if (kg == 0) {
      return;
    }
    double share = kg / gasKg;
    chillK += (ADIABATIC - 1) * (temperatureK - chillK) * share * 0.5;
    gasKg -= kg;
    if (kg > 0) {
      airMol *= 1 - share;
    }
    passedKg += kg;
  }

  /** Net CO2 leaving, kg/s. */
  private double outflow() {
    double gauge = pressurePaGauge();
    double flow = 0;
    if (ventAreaM2 > 0) {
      flow += orifice(ventAreaM2, gauge);
    }
    lifting = reliefOpen ? orifice(reliefAreaM2, gauge) : 0;
    flow += lifting;
    double perPa = gasKg / (gauge + ambientPa) / 5.0;
    if (gauge > spundingPaGauge) {
      flow += (gauge - spundingPaGauge) * perPa;
    }
    if (gauge < supplyPaGauge) {
      flow -= (supplyPaGauge - gauge) * perPa;
    }
    return flow;
  }

  /** Isentropic orifice, CO2 share only; draws nothing in. */
  private double orifice(double area, double gauge) {
    if (gauge <= 0) {
      return 0;
    }
    double p = gauge + ambientPa;
    double ratio = Math.max(ambientPa / p, CRITICAL_RATIO);
    double k = ADIABATIC;
    double term = Math.pow(ratio, 2 / k) - Math.pow(ratio, (k + 1) / k);
    double density = gasKg / headspaceM3();
    return area * Math.sqrt(2 * k / (k - 1) * p * density * Math.max(term, 0));
  }
}

package tunwarden.simulate;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/** A drawn vessel: what it truly is, and what its user writes down about it. */
final class World {
  static final double BAR = 1e5;
  static final double HOUR = 3600;
  static final double DAY = 86_400;
  private static final double GAUGE_U95_PA = 1000;
  private static final double THERMOMETER_U95_K = 0.3;
  private static final double AMBIENT_U95_PA = 3000;
  private static final double RELATION_U = 0.01;

  final Random random;
  final double volumeM3;
  final double fillM3;
  final double relief;
  final double transfer;
  final double startK;
  Instruments instruments;
  final Tank tank;
  private final double trueFillM3;
  private final boolean beer;
  private final double ambientPa;

  World(long seed, double volumeM3, double fillShare) {
    this(seed, volumeM3, fillShare, false);
  }

  World(long seed, double volumeM3, double fillShare, boolean ferments) {
    random = new Random(seed * 7919 + 17);
    random.nextDouble();
    this.volumeM3 = volumeM3 > 0 ? volumeM3 : 0.05 * Math.pow(100, random.nextDouble());
    double share = fillShare > 0 ? fillShare : between(0.75, 0.96);
    fillM3 = share * this.volumeM3;
    double error = 0.01 * random.nextGaussian();
    trueFillM3 = Math.min(0.993, Math.max(share + error, 0.3)) * this.volumeM3;
    relief = between(1.2, 3) * BAR;
    transfer = Math.pow(10, between(-6.3, -3.5));
    startK = 273.15 + between(1, 18);
    beer = random.nextBoolean() || ferments;
    ambientPa = 101_325 + AMBIENT_U95_PA / 2 * random.nextGaussian();
    instruments = Instruments.draw(random, GAUGE_U95_PA, THERMOMETER_U95_K);
    double gasTime = Math.pow(10, between(1.5, 2.7));
    TrueLiquid liquid = new TrueLiquid(beer, RELATION_U * random.nextGaussian());
    tank =
        new Tank(
            new Tank.Build(this.volumeM3, trueFillM3, liquid, gasTime, startK), startK, transfer);
    tank.ambientPa = ambientPa;
    tank.reliefOpensPaGauge = relief - between(0, 0.09) * BAR;
    tank.reliefShutsPaGauge = tank.reliefOpensPaGauge * between(0.85, 0.95);
    tank.reliefAreaM2 = ventArea();
  }

  double between(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  /** An opening that empties the headspace by a bar or so in a few seconds to a minute. */
  double ventArea() {
    return (volumeM3 - trueFillM3) / between(5, 60) / 200;
  }

  /** Litres in the tank, as truly filled. */
  double trueFillM3() {
    return trueFillM3;
  }

  Vessel described() {
    Vessel plain =
        Vessel.plain("T1", volumeM3, fillM3, Liquid.of(beer ? LiquidKind.BEER : LiquidKind.WATER));
    return new Vessel(
        plain.id(),
        plain.title(),
        volumeM3,
        fillM3,
        new Vessel.Contents(plain.liquid(), GasMix.CO2, 0),
        Closure.INFER,
        new Limits(
            Optional.of(ReliefSetting.stated(relief, 0.1 * BAR)),
            OptionalDouble.empty(),
            OptionalDouble.empty()),
        plain.orifice(),
        new Site(101_325, AMBIENT_U95_PA, Optional.empty()),
        OptionalDouble.empty(),
        new Accuracy(GAUGE_U95_PA, THERMOMETER_U95_K, 0.02 * volumeM3),
        plain.prospects());
  }
}

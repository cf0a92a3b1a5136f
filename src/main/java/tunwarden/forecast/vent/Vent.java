package tunwarden.forecast.vent;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.World;
import tunwarden.forecast.room.RoomAir;
import tunwarden.physics.gas.Gas;
import tunwarden.units.Constants;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Room;

/**
 * Tries a vent. The ensemble can be kept between questions: moving the target costs only the answer
 * itself.
 */
public final class Vent {
  private static final double CO2_NORMAL_M3_PER_MOL =
      Gas.CO2.molarMass() / Constants.CO2_VOLUME_KG_PER_M3;
  private static final double IDEAL_NORMAL_M3_PER_MOL = 0.022414;
  private static final double ROOM_M3_PER_MOL = 0.024055;
  private static final double MOST_OF_IT = Math.log(20);
  private static final double DISCHARGE_U95 = 0.1;

  private static final int ONCE_KG = 0;
  private static final int ONCE_M3 = 1;
  private static final int ONCE_CO2 = 2;
  private static final int FOLLOWS = 3;
  private static final int REBOUND = 4;
  private static final int EXCESS = 5;
  private static final int OTHER_M3 = 6;

  private Vent() {}

  /**
   * The answer.
   *
   * @throws IllegalArgumentException when {@link VentQuestion#fault} finds something
   */
  public static VentAnswer of(Ensemble ensemble, VentQuestion question) {
    Present present = ensemble.present();
    question.fault(present).ifPresent(Vent::refuse);
    Spread[] at = ensemble.ranges(world -> values(world, question.toPaGauge()));
    Spread transfer = present.activity().transferPerS();
    StagedPlan plan = plan(ensemble.middle(), present, question);
    Optional<RoomAfter> room = question.room().map(place -> room(place, at, transfer));
    VentAnswer bare =
        new VentAnswer(
            new VentAnswer.Once(at[ONCE_KG], at[ONCE_M3], at[ONCE_CO2]),
            at[FOLLOWS],
            followTime(transfer),
            at[REBOUND],
            at[EXCESS],
            question.path().map(path -> blowdown(ensemble, question.toPaGauge(), path)),
            plan,
            room,
            List.of());
    return VentCautions.added(bare, question);
  }

  private static void refuse(String sentence) {
    throw new IllegalArgumentException(sentence);
  }

  private static double[] values(World world, double toPaGauge) {
    double target = Math.min(toPaGauge, world.paGauge());
    World after = world.vented(target);
    double co2 = world.headspaceMol(Gas.CO2) - after.headspaceMol(Gas.CO2);
    double others = -co2;
    for (Gas gas : Gas.all()) {
      others += world.headspaceMol(gas) - after.headspaceMol(gas);
    }
    double[] values = new double[7];
    values[ONCE_KG] = world.headspaceKgOver(after);
    values[ONCE_M3] = co2 * CO2_NORMAL_M3_PER_MOL + others * IDEAL_NORMAL_M3_PER_MOL;
    values[ONCE_CO2] = co2 * Gas.CO2.molarMass();
    values[FOLLOWS] = world.releasedIfHeldKg(toPaGauge);
    values[REBOUND] = after.restPaGauge(world.temperatureK());
    double rest = world.equilibriumKgPerM3(toPaGauge + world.ambientPa());
    values[EXCESS] = world.dissolvedKgPerM3() / rest - 1;
    values[OTHER_M3] = others * ROOM_M3_PER_MOL;
    return values;
  }

  private static TimeRange followTime(Spread transfer) {
    return new TimeRange(
        StagedPlan.seconds(MOST_OF_IT / transfer.middle()),
        StagedPlan.seconds(MOST_OF_IT / transfer.high()),
        transfer.low() > 0
            ? Optional.of(StagedPlan.seconds(MOST_OF_IT / transfer.low()))
            : Optional.empty());
  }

  private static Spread blowdown(Ensemble ensemble, double toPaGauge, ReliefOrifice path) {
    Spread seconds = ensemble.range(world -> Blowdown.seconds(world, toPaGauge, path));
    double kd = DISCHARGE_U95 * seconds.middle();
    return new Spread(
        seconds.middle() - Math.hypot(seconds.middle() - seconds.low(), kd),
        seconds.middle(),
        seconds.middle() + Math.hypot(seconds.high() - seconds.middle(), kd));
  }

  private static StagedPlan plan(World world, Present present, VentQuestion question) {
    DoubleUnaryOperator headspaceKg =
        pa -> -world.headspaceKgOver(world.vented(pa - world.ambientPa()));
    return StagedPlan.of(
        new StagedPlan.Start(
            present.pressurePaAbsolute(),
            question.toPaGauge() + world.ambientPa(),
            world.ambientPa(),
            world.dissolvedKgPerM3(),
            world.liquidM3(),
            present.activity().transferPerS(),
            world::equilibriumKgPerM3,
            headspaceKg),
        question.foamBound());
  }

  private static RoomAfter room(Room place, Spread[] at, Spread transfer) {
    Spread held =
        new Spread(
            afterAll(place, at[ONCE_CO2].low() + at[FOLLOWS].low()),
            afterAll(place, at[ONCE_CO2].middle() + at[FOLLOWS].middle()),
            afterAll(place, at[ONCE_CO2].high() + at[FOLLOWS].high()));
    double allM3 = RoomAir.volumeM3(at[ONCE_CO2].high() + at[FOLLOWS].high()) + at[OTHER_M3].high();
    return new RoomAfter(
        new Spread(
            afterAll(place, at[ONCE_CO2].low()),
            afterAll(place, at[ONCE_CO2].middle()),
            afterAll(place, at[ONCE_CO2].high())),
        held,
        place.airChangesPerS() > 0
            ? Optional.of(
                new Spread(
                    peak(place, at[ONCE_CO2].low(), at[FOLLOWS].low(), transfer.low()),
                    peak(place, at[ONCE_CO2].middle(), at[FOLLOWS].middle(), transfer.middle()),
                    peak(place, at[ONCE_CO2].high(), at[FOLLOWS].high(), transfer.high())))
            : Optional.empty(),
        RoomAir.oxygenLeft(allM3, place));
  }

  private static double afterAll(Room place, double co2Kg) {
    return RoomAir.afterRelease(RoomAir.volumeM3(co2Kg), place);
  }

  private static double peak(Room place, double onceKg, double followsKg, double ratePerS) {
    return RoomAir.peak(RoomAir.volumeM3(onceKg), RoomAir.volumeM3(followsKg), ratePerS, place);
  }
}

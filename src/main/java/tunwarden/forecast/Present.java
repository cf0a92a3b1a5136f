package tunwarden.forecast;

import java.time.Instant;
import java.util.Optional;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.Mode;
import tunwarden.physics.liquid.WagnerPruss1993;
import tunwarden.vessel.Vessel;

/**
 * What every forecast starts from: one vessel as it is now.
 *
 * @param vessel its description
 * @param at when
 * @param pressurePaGauge Pa gauge
 * @param temperatureK of liquid and headspace, K
 * @param fillTemperatureK temperature at which the vessel's fill was read, K
 * @param dissolvedKgPerM3 dissolved CO2, kg/m³ of liquid (g/L); empty: in equilibrium with the
 *     headspace
 * @param airPaAbsolute air in the headspace, partial pressure, Pa absolute
 * @param activity what goes on by itself
 */
public record Present(
    Vessel vessel,
    Instant at,
    double pressurePaGauge,
    double temperatureK,
    double fillTemperatureK,
    Optional<Uncertain> dissolvedKgPerM3,
    Uncertain airPaAbsolute,
    Activity activity) {

  /**
   * What goes on without anyone touching a valve.
   *
   * @param mode how the headspace behaves
   * @param transferPerS mass transfer coefficient kLa with its range, 1/s
   * @param gasMadeKgPerM3PerS gas being made, kg/m³/s
   */
  public record Activity(Mode mode, Spread transferPerS, double gasMadeKgPerM3PerS) {}

  /** Share of a stated amount of left-over air that it may be off by, 95 %: no source. */
  private static final double AIR_SHARE = 0.5;

  /** Median and 95 % factor of kL for a liquid of which nothing else is known, m/s. */
  private static final double TRANSFER_M_PER_S = 5e-6;

  private static final double TRANSFER_FACTOR = 25;

  /** From the estimator's belief, the fill taken as read at the present temperature. */
  public static Present of(Vessel vessel, Estimate estimate) {
    double dryPa =
        estimate.pressurePaGauge()
            + vessel.site().ambientPaAbsolute()
            - WagnerPruss1993.pa(estimate.temperatureK());
    return new Present(
        vessel,
        estimate.at(),
        estimate.pressurePaGauge(),
        estimate.temperatureK(),
        estimate.temperatureK(),
        Optional.of(new Uncertain(estimate.dissolvedKgPerM3(), estimate.dissolvedU95KgPerM3())),
        new Uncertain(estimate.airFraction() * dryPa, estimate.airFractionU95() * dryPa),
        new Activity(estimate.mode(), estimate.transferPerS(), estimate.gasMadeKgPerM3PerS()));
  }

  /**
   * Without instruments: a sealed vessel at rest, its liquid in equilibrium with the headspace, its
   * air as the vessel's description says.
   */
  public static Present atRest(Vessel vessel, double pressurePaGauge, double temperatureK) {
    return new Present(
        vessel,
        Instant.EPOCH,
        pressurePaGauge,
        temperatureK,
        temperatureK,
        Optional.empty(),
        new Uncertain(
            vessel.contents().airPaAbsolute(), AIR_SHARE * vessel.contents().airPaAbsolute()),
        new Activity(Mode.SEALED, usualTransfer(vessel.fillM3()), 0));
  }

  /**
   * kLa of a liquid of which only the volume is known: kL from a quiet cold keg to a rousing tank
   * (log-normal, judgement over the published range), liquid as deep as it is wide.
   */
  public static Spread usualTransfer(double liquidM3) {
    double depthM = Math.cbrt(4 * Math.max(liquidM3, 1e-6) / Math.PI);
    double middle = TRANSFER_M_PER_S / depthM;
    return new Spread(middle / TRANSFER_FACTOR, middle, middle * TRANSFER_FACTOR);
  }

  /** The same with its fill read at another temperature, K. */
  public Present filledAt(double otherK) {
    return new Present(
        vessel,
        at,
        pressurePaGauge,
        temperatureK,
        otherK,
        dissolvedKgPerM3,
        airPaAbsolute,
        activity);
  }

  /** Pressure, Pa absolute. */
  public double pressurePaAbsolute() {
    return pressurePaGauge + vessel.site().ambientPaAbsolute();
  }
}

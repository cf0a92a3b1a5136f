package tunwarden.report.find;

import java.time.Instant;
import java.util.Locale;
import java.util.Optional;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.units.Constants;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Gives what was found its kind, the gas it moved, a confidence and the evidence in words. */
final class Naming {
  /** A reseating valve gives up no more than this share of its opening pressure (judgement). */
  private static final double MOST_BLOWDOWN = 0.35;

  /**
   * Excess of the exponent between pressure and gas kept: 0.30 if no heat came from the walls (the
   * isentrope of CO2), 0 if all did; judgement for openings of seconds to a minute.
   */
  private static final double COOLING = 0.22;

  private static final double WALL_S = 120;

  private final Vessel vessel;
  private final double u95Pa;
  private final Display display = Display.METRIC;

  Naming(Vessel vessel, double u95Pa) {
    this.vessel = vessel;
    this.u95Pa = u95Pa;
  }

  Event movement(Movement movement) {
    double gasKg = gasKg(movement);
    if (movement.changePa() > 0) {
      return event(EventKind.CHARGE, movement, gasKg, sure(movement), rise(movement, gasKg));
    }
    Optional<ReliefSetting> relief = vessel.limits().relief();
    boolean atSetting =
        relief.isPresent() && movement.fromPa() >= relief.get().earliestLiftPaGauge() - 2 * u95Pa;
    boolean reseated =
        movement.toPa() > (1 - MOST_BLOWDOWN) * movement.fromPa() && movement.toPa() > 0;
    if (atSetting && reseated) {
      return event(EventKind.LIFT, movement, gasKg, sure(movement), lift(movement, gasKg, relief));
    }
    return event(EventKind.VENT, movement, gasKg, sure(movement), fall(movement, gasKg, atSetting));
  }

  private static double sure(Movement movement) {
    return Math.min(0.98, 0.5 + 0.12 * movement.sharpness());
  }

  private String lift(Movement movement, double gasKg, Optional<ReliefSetting> relief) {
    double set = relief.orElseThrow().setPaGauge();
    return "the pressure fell from "
        + display.gauge(movement.fromPa())
        + " to "
        + display.gauge(movement.toPa())
        + within(movement)
        + ", starting between the earliest conforming opening and the setting of "
        + display.gauge(set)
        + ", and stopped falling by itself as a reseating valve does; a shut vessel would have"
        + " stayed on its course; "
        + mass(gasKg)
        + " left";
  }

  private String fall(Movement movement, double gasKg, boolean atSetting) {
    return "the pressure fell from "
        + display.gauge(movement.fromPa())
        + " to "
        + display.gauge(movement.toPa())
        + within(movement)
        + ", which a shut vessel cannot do by itself; "
        + mass(gasKg)
        + " left"
        + (atSetting ? "; it started near the relief setting but went further than a reseat" : "");
  }

  private String rise(Movement movement, double gasKg) {
    return "the pressure rose from "
        + display.gauge(movement.fromPa())
        + " to "
        + display.gauge(movement.toPa())
        + within(movement)
        + " at "
        + display.temperature(movement.kelvin())
        + ", faster than liquid gives gas off; "
        + mass(-gasKg)
        + " came in";
  }

  private static String within(Movement movement) {
    return " within " + duration(movement.untilMs() - movement.fromMs());
  }

  static String duration(long ms) {
    long seconds = Math.max(1, ms / 1000);
    if (seconds < 180) {
      return seconds + " s";
    }
    return seconds < 3 * 3600
        ? Math.round(seconds / 60.0) + " min"
        : String.format(Locale.ROOT, "%.1f h", seconds / 3600.0);
  }

  private static String mass(double kg) {
    return kg < 1 ? Math.round(kg * 1000) + " g" : String.format(Locale.ROOT, "%.2f kg", kg);
  }

  Event spike(Movement movement) {
    return event(
        EventKind.SPIKE,
        movement,
        0,
        sure(movement),
        "the pressure signal jumped to "
            + display.gauge(movement.toPa())
            + " and was back on its course a moment later, which gas in a vessel cannot do");
  }

  Event gap(GapTracker.Gap gap) {
    return new Event(
        EventKind.GAP,
        vessel.id(),
        Instant.ofEpochMilli(gap.before().ms()),
        Instant.ofEpochMilli(gap.after().ms()),
        false,
        gap.before().paGauge(),
        gap.after().paGauge(),
        0,
        0.99,
        "no rows for " + duration(gap.after().ms() - gap.before().ms()));
  }

  Event frozen(StillTracker.Stretch stretch) {
    String moved =
        Math.abs(stretch.untilK() - stretch.fromK()) > 0.3
            ? " while the temperature went from "
                + display.temperature(stretch.fromK())
                + " to "
                + display.temperature(stretch.untilK())
            : "";
    return new Event(
        EventKind.FROZEN,
        vessel.id(),
        Instant.ofEpochMilli(stretch.fromMs()),
        Instant.ofEpochMilli(stretch.untilMs()),
        Double.isNaN(stretch.afterPa()),
        stretch.paGauge(),
        Double.isNaN(stretch.afterPa()) ? stretch.paGauge() : stretch.afterPa(),
        0,
        0.9,
        "the pressure signal showed exactly "
            + display.gauge(stretch.paGauge())
            + " for "
            + duration(stretch.untilMs() - stretch.fromMs())
            + moved
            + ", longer than its own noise allows");
  }

  Event warming(WarmingTracker.Rise rise) {
    boolean lost =
        rise.endsHigh()
            && vessel.warmToK().isPresent()
            && rise.toK() - rise.fromK() > 0.25 * (vessel.warmToK().getAsDouble() - rise.fromK());
    String text =
        "the liquid warmed from "
            + display.temperature(rise.fromK())
            + " to "
            + display.temperature(rise.toK())
            + " in "
            + duration(rise.untilMs() - rise.fromMs())
            + (lost ? ", heading for the temperature of its surroundings" : "");
    return new Event(
        lost ? EventKind.COOLING_FAILURE : EventKind.WARMING,
        vessel.id(),
        Instant.ofEpochMilli(rise.fromMs()),
        Instant.ofEpochMilli(rise.untilMs()),
        false,
        Double.NaN,
        Double.NaN,
        0,
        0.9,
        text);
  }

  Event overRelief(Movement stretch, ReliefSetting relief) {
    return event(
        EventKind.OVER_RELIEF,
        stretch,
        0,
        0.95,
        "the pressure stood above the relief setting of "
            + display.gauge(relief.setPaGauge())
            + " for "
            + duration(stretch.untilMs() - stretch.fromMs())
            + ", at most "
            + display.gauge(stretch.toPa())
            + ", and no opening is seen: valve, setting or gauge is not what it should be");
  }

  private Event event(
      EventKind kind, Movement movement, double gasKg, double confidence, String why) {
    return new Event(
        kind,
        vessel.id(),
        Instant.ofEpochMilli(movement.fromMs()),
        Instant.ofEpochMilli(movement.untilMs()),
        false,
        movement.fromPa(),
        movement.toPa(),
        gasKg,
        confidence,
        why);
  }

  /** Gas that left the headspace, kg; negative when it came in. */
  private double gasKg(Movement movement) {
    double ambient = vessel.site().ambientPaAbsolute();
    double before = Math.max(1, movement.fromPa() + ambient);
    double after = Math.max(1, movement.toPa() + ambient);
    double seconds = (movement.untilMs() - movement.fromMs()) / 1000.0;
    double exponent = 1 / (1 + COOLING * Math.exp(-seconds / WALL_S));
    double kelvin = Double.isNaN(movement.kelvin()) ? 288.15 : movement.kelvin();
    double molesBefore =
        before
            * headspaceM3(kelvin)
            / (RealGas.z(Gas.CO2, before, kelvin) * Constants.GAS_CONSTANT * kelvin);
    return molesBefore * (1 - Math.pow(after / before, exponent)) * Gas.CO2.molarMass();
  }

  /** Taken as filled at 4 °C: a fill is stated to 2 % at best, expansion is a tenth of that. */
  private double headspaceM3(double kelvin) {
    LiquidDensity density = LiquidDensity.of(vessel.liquid());
    double swell = density.kgPerM3(277.15) / density.kgPerM3(kelvin);
    return Math.max(1e-4 * vessel.volumeM3(), vessel.volumeM3() - vessel.fillM3() * swell);
  }
}

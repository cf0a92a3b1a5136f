package tunwarden.forecast.vent;

import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.TimeRange;

/**
 * What a vent does; every value with its 95 % range.
 *
 * @param once gas that leaves the headspace on the way down
 * @param followsKg CO2 that the liquid gives off if the vent is then held open, to rest, kg
 * @param followTime until 95 % of that has come
 * @param reboundPaGauge pressure once shut again and at rest, Pa gauge
 * @param supersaturation dissolved over equilibrium at the target, minus 1
 * @param blowdownS time down to the target through the given path, s
 * @param plan steps that keep supersaturation under the bound
 * @param room the room's air, if a room is described
 * @param cautions what to mind first
 */
public record VentAnswer(
    Once once,
    Spread followsKg,
    TimeRange followTime,
    Spread reboundPaGauge,
    Spread supersaturation,
    Optional<Spread> blowdownS,
    StagedPlan plan,
    Optional<RoomAfter> room,
    List<Caution> cautions) {

  /**
   * Headspace gas that leaves at once.
   *
   * @param kg all species, kg
   * @param normalM3 all species, m³ at 0 °C and 1 atm
   * @param co2Kg the CO2 in it, kg
   */
  public record Once(Spread kg, Spread normalM3, Spread co2Kg) {}

  /** What all of it assumes, in words. */
  public static final List<String> ASSUMPTIONS =
      List.of(
          "at once: headspace gas only, at the vessel's temperature; the low end is a vent so quick"
              + " that the gas left behind is cold",
          "to follow: gas of the liquid until at rest, at a rate that bubbles can multiply",
          "back to: shut right after the vent, at the same temperature, at rest",
          "room: mixed well; CO2 lies low, so near the floor there is more");
}

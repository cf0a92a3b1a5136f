package tunwarden.forecast.seal;

import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.TimeRange;

/**
 * What closing a fermenting vessel comes to; every value with its 95 % range.
 *
 * @param toComeKgPerM3 CO2 still to come, kg/m³ of liquid now
 * @param paGauge pressure when all of it has come, shut and at rest, Pa gauge
 * @param dissolvedKgPerM3 dissolved by then, kg/m³
 * @param lifts whether that is above the valve's earliest opening; empty without a relief setting
 * @param untilLift how long until then; empty when it does not lift
 * @param holdPaGauge level to hold instead so that the carbonation wanted is reached, Pa gauge
 * @param reachesWanted whether the gas to come is enough for that; empty when nothing is wanted
 * @param cautions what to mind first
 */
public record SealAnswer(
    Spread toComeKgPerM3,
    Spread paGauge,
    Spread dissolvedKgPerM3,
    Optional<Boolean> lifts,
    Optional<TimeRange> untilLift,
    Optional<Spread> holdPaGauge,
    Optional<Boolean> reachesWanted,
    List<Caution> cautions) {

  /** What all of it assumes, in words. */
  public static final List<String> ASSUMPTIONS =
      List.of(
          "gas to come: Balling's balance from the extract left, all of it fermented",
          "pressure: shut now, at the present temperature, at rest at the end; pressure may stop the"
              + " yeast earlier",
          "time: all gas shared with the liquid as it comes; with a lazy liquid the gauge is late",
          "level to hold: under CO2 alone until fermentation has ended, then shut and brought to the"
              + " temperature wanted");
}

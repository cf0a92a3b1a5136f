package tunwarden.forecast;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Everything computed about the future of one vessel.
 *
 * @param projections where the pressure goes, by scenario
 * @param timeToLift time until the earliest conforming opening pressure at the present trend;
 *     empty: not within the horizon, or no relief setting
 * @param soonestToLift time until the upper edge of the trend's band gets there; empty: not within
 *     the horizon, or no relief setting
 * @param horizon how far the trend was run
 * @param liftTemperatureK temperature at which the valve may lift if the closed vessel warms
 * @param liquidFullK temperature at which no headspace is left
 * @param trend the forward run for the chart
 * @param cautions what to mind before acting
 * @param whatIfs what may happen or be done, those of most weight first
 */
public record Outlook(
    List<Projection> projections,
    Optional<TimeRange> timeToLift,
    Optional<Duration> soonestToLift,
    Duration horizon,
    OptionalDouble liftTemperatureK,
    OptionalDouble liquidFullK,
    List<TrendPoint> trend,
    List<Caution> cautions,
    List<WhatIf> whatIfs) {
  /** Nothing can be said. */
  public static final Outlook NONE =
      new Outlook(
          List.of(),
          Optional.empty(),
          Optional.empty(),
          Duration.ZERO,
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          List.of(),
          List.of(),
          List.of());

  /** Keeps its own copies. */
  public Outlook {
    projections = List.copyOf(projections);
    trend = List.copyOf(trend);
    cautions = List.copyOf(cautions);
    whatIfs = List.copyOf(whatIfs);
  }

  /** The same with what may happen or be done. */
  public Outlook with(List<WhatIf> others) {
    return new Outlook(
        projections,
        timeToLift,
        soonestToLift,
        horizon,
        liftTemperatureK,
        liquidFullK,
        trend,
        cautions,
        others);
  }

  /** One thing that may happen, if it was worked out. */
  public Optional<WhatIf> whatIf(WhatIf.Kind kind) {
    return whatIfs.stream().filter(each -> each.kind() == kind).findFirst();
  }

  /** The projection of one scenario, if computed. */
  public Optional<Projection> projection(Scenario scenario) {
    return projections.stream().filter(p -> p.scenario() == scenario).findFirst();
  }
}

package tunwarden.alarm;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.assess.Assessment;
import tunwarden.forecast.Projection;
import tunwarden.forecast.Scenario;
import tunwarden.forecast.TimeRange;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** Alarms told by what would follow. */
final class OutlookConditions {
  /**
   * The likely time alone would let a vessel of which little is known lift unannounced; the early
   * edge of its range within the whole limit would cry wolf each time that range is wide. It counts
   * within half the limit: on simulated vessels that gave no false alarm more than the likely time.
   */
  private static final int EARLY = 2;

  private final Assessment assessment;
  private final AlarmSettings settings;
  private final Page page;
  private final Display display;

  private OutlookConditions(Assessment assessment, AlarmSettings settings, Page page) {
    this.assessment = assessment;
    this.settings = settings;
    this.page = page;
    this.display = settings.display();
  }

  static List<Condition> of(Assessment assessment, AlarmSettings settings, Page page) {
    OutlookConditions conditions = new OutlookConditions(assessment, settings, page);
    return List.of(
        conditions.timeToReliefShort(), conditions.warmUpWouldLift(), conditions.liquidFull());
  }

  private Condition timeToReliefShort() {
    AlarmKind kind = AlarmKind.TIME_TO_RELIEF_SHORT;
    if (assessment.vessel().limits().relief().isEmpty()) {
      return Condition.no(kind);
    }
    if (isBlind()) {
      return blind(kind);
    }
    Optional<TimeRange> range = assessment.outlook().timeToLift();
    Duration back = page.isActive(kind) ? settings.deadbands().time() : Duration.ZERO;
    Duration limit = settings.timeToRelief();
    if (range.isPresent() && range.get().middle().compareTo(limit.plus(back)) < 0) {
      return Conditions.when(true, kind, timeWords(range.get()));
    }
    Optional<Duration> soonest = assessment.outlook().soonestToLift();
    boolean early =
        soonest.isPresent() && soonest.get().compareTo(limit.dividedBy(EARLY).plus(back)) < 0;
    return Conditions.when(early, kind, early ? earlyWords(soonest.get(), range) : "");
  }

  private String earlyWords(Duration soonest, Optional<TimeRange> range) {
    String likely =
        range
            .map(time -> "likely in " + Words.duration(time.middle()))
            .orElse("likely not within " + Words.duration(assessment.outlook().horizon()));
    return "At the upper edge of its range the trend reaches the valve's earliest opening in "
        + Words.duration(soonest)
        + ", "
        + likely
        + ".";
  }

  private String timeWords(TimeRange range) {
    String latest =
        range.high().map(high -> " to " + Words.duration(high)).orElse(", or not at all");
    return "At the present trend the valve may open in "
        + Words.duration(range.middle())
        + " ("
        + Words.duration(range.low())
        + latest
        + "), sooner than "
        + Words.duration(settings.timeToRelief())
        + ".";
  }

  private Condition warmUpWouldLift() {
    AlarmKind kind = AlarmKind.WARM_UP_WOULD_LIFT;
    Optional<ReliefSetting> relief = assessment.vessel().limits().relief();
    if (relief.isEmpty() || assessment.vessel().warmToK().isEmpty()) {
      return Condition.no(kind);
    }
    Optional<Projection> warm = assessment.outlook().projection(Scenario.WARM);
    if (isBlind() || warm.isEmpty()) {
      return blind(kind);
    }
    double lift = relief.get().earliestLiftPaGauge();
    double band = page.isActive(kind) ? settings.deadbands().pressurePa() : 0;
    boolean yes = warm.get().paGauge() >= lift - band;
    return Conditions.when(yes, kind, yes ? warmWords(warm.get(), lift) : "");
  }

  private String warmWords(Projection warm, double liftPaGauge) {
    OptionalDouble at = assessment.outlook().liftTemperatureK();
    return "With cooling lost, "
        + warm.words()
        + ", it reaches "
        + display.gauge(warm.paGauge())
        + "; the valve may open from "
        + display.gauge(liftPaGauge)
        + (at.isPresent() ? ", passed at " + display.temperature(at.getAsDouble()) : "")
        + ".";
  }

  private Condition liquidFull() {
    AlarmKind kind = AlarmKind.LIQUID_FULL;
    if (!assessment.temperature().isUsable()) {
      return Conditions.without(assessment.temperature(), kind);
    }
    OptionalDouble full = assessment.outlook().liquidFullK();
    if (full.isEmpty()) {
      return isBlind() ? blind(kind) : Condition.no(kind);
    }
    double left = full.getAsDouble() - assessment.temperature().value().orElse(Double.NaN);
    double band = page.isActive(kind) ? settings.deadbands().temperatureK() : 0;
    boolean yes = !(left >= settings.liquidFullWithinK() + band);
    String text =
        yes
            ? "Warming by "
                + display.temperatureDifference(left)
                + " to "
                + display.temperature(full.getAsDouble())
                + " leaves no headspace."
            : "";
    return Conditions.when(yes, kind, text);
  }

  /** Forecasts rest on both instruments. */
  private boolean isBlind() {
    return !assessment.pressure().isUsable()
        || !assessment.temperature().isUsable()
        || assessment.estimate().isEmpty();
  }

  private Condition blind(AlarmKind kind) {
    return assessment.temperature().isUsable()
        ? Conditions.without(assessment.pressure(), kind)
        : Conditions.without(assessment.temperature(), kind);
  }
}

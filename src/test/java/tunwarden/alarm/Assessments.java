package tunwarden.alarm;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.assess.Observed;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Projection;
import tunwarden.forecast.Scenario;
import tunwarden.forecast.TimeRange;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quality;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Builds assessments by hand; no estimator takes part. */
public final class Assessments {
  /** Where every test's data time begins. */
  public static final Instant START = Instant.parse("2026-03-02T06:00:00Z");

  private static final double U95_PA = 1000;

  private final Vessel vessel;
  private Instant time = START;
  private Observed pressure = observed(0.8e5, Quality.GOOD);
  private Observed temperature = observed(277.15, Quality.GOOD);
  private Optional<TimeRange> timeToLift = Optional.empty();
  private Optional<Duration> soonestToLift = Optional.empty();
  private OptionalDouble liquidFullK = OptionalDouble.empty();
  private final List<Projection> projections = new ArrayList<>();
  private final List<Event> events = new ArrayList<>();

  private Assessments(Vessel vessel) {
    this.vessel = vessel;
  }

  /** A 2000 L vessel, relief 1.5 bar less 0.1, limit 2 bar, vacuum limit -0.02 bar. */
  public static Vessel vessel(String id) {
    return Vessel.plain(id, 2.0, 1.8, Liquid.of(LiquidKind.BEER))
        .withLimits(
            new Limits(
                Optional.of(ReliefSetting.stated(1.5e5, 0.1e5)),
                OptionalDouble.of(2.0e5),
                OptionalDouble.of(-2000)));
  }

  public static Assessments of(String id) {
    return new Assessments(vessel(id));
  }

  public static Assessments of(Vessel vessel) {
    return new Assessments(vessel);
  }

  public Assessments at(long seconds) {
    time = START.plusSeconds(seconds);
    return this;
  }

  public Assessments bar(double barGauge) {
    return pressure(observed(barGauge * 1e5, Quality.GOOD));
  }

  public Assessments pressure(Observed observed) {
    pressure = observed;
    return this;
  }

  public Assessments pressure(Quality quality) {
    return pressure(observed(0.8e5, quality));
  }

  public Assessments temperature(Observed observed) {
    temperature = observed;
    return this;
  }

  public Assessments liftIn(Duration middle) {
    timeToLift = Optional.of(new TimeRange(middle, middle.dividedBy(2), Optional.empty()));
    return soonestIn(middle.dividedBy(2));
  }

  /** The early edge of the trend's range, whatever the likely time. */
  public Assessments soonestIn(Duration early) {
    soonestToLift = Optional.of(early);
    return this;
  }

  public Assessments liquidFullAt(double kelvin) {
    liquidFullK = OptionalDouble.of(kelvin);
    return this;
  }

  public Assessments warmTo(double barGauge) {
    double pa = barGauge * 1e5;
    projections.add(new Projection(Scenario.WARM, "warmed to 24 °C", pa, pa, pa, Optional.empty()));
    return this;
  }

  /** An event that began at the given second. */
  public Assessments event(EventKind kind, long began, boolean open) {
    Instant start = START.plusSeconds(began);
    events.add(
        new Event(kind, vessel.id(), start, time, open, 1.45e5, 1.1e5, 0.2, 0.9, "fell fast"));
    return this;
  }

  /** Something seen just now. */
  public static Observed observed(double value, Quality quality) {
    return new Observed(
        OptionalDouble.of(value), Optional.of(START), quality, Duration.ofSeconds(1));
  }

  /** The assessment described so far. */
  public Assessment build() {
    Optional<Margins> margins =
        pressure.isUsable() ? vessel.limits().relief().map(this::margins) : Optional.empty();
    Outlook outlook =
        new Outlook(
            projections,
            timeToLift,
            soonestToLift,
            Duration.ofHours(48),
            OptionalDouble.empty(),
            liquidFullK,
            List.of(),
            List.of(),
            List.of());
    return new Assessment(
        vessel,
        time,
        pressure,
        temperature,
        Optional.of(estimate()),
        margins,
        outlook,
        List.of(),
        events,
        List.of());
  }

  private Margins margins(ReliefSetting relief) {
    double margin = relief.earliestLiftPaGauge() - pressure.value().orElse(Double.NaN) - U95_PA;
    return new Margins(margin, margin / relief.setPaGauge(), U95_PA, OptionalDouble.empty());
  }

  private Estimate estimate() {
    return new Estimate(
        time,
        pressure.value().orElse(0),
        277.15,
        5.3,
        0.2,
        5.5,
        0.9,
        0.04,
        0.03,
        Mode.SEALED,
        0.9,
        new Estimate.Spread(1e-6, 1e-5, 1e-4),
        0,
        "");
  }
}

package tunwarden.serve;

import io.prometheus.metrics.config.EscapingScheme;
import io.prometheus.metrics.expositionformats.OpenMetricsTextFormatWriter;
import io.prometheus.metrics.model.snapshots.CounterSnapshot;
import io.prometheus.metrics.model.snapshots.GaugeSnapshot;
import io.prometheus.metrics.model.snapshots.Labels;
import io.prometheus.metrics.model.snapshots.MetricSnapshot;
import io.prometheus.metrics.model.snapshots.MetricSnapshots;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmCounts;
import tunwarden.alarm.AlarmState;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.units.Unit;

/** The newest figures as OpenMetrics text. A figure that is not known is left out. */
final class MetricsPage {
  static final String CONTENT_TYPE = OpenMetricsTextFormatWriter.CONTENT_TYPE;

  private final OpenMetricsTextFormatWriter writer = OpenMetricsTextFormatWriter.create();

  byte[] write(Served served) throws IOException {
    List<Assessment> all = served.state().assessments();
    Instant now = served.clock().instant();
    List<MetricSnapshot> metrics = new ArrayList<>();
    metrics.add(
        gauge("pressure_bar_gauge", "Headspace pressure, bar gauge.", all, a -> bar(a.pressure())));
    metrics.add(
        gauge("temperature_celsius", "Liquid temperature.", all, a -> celsius(a.temperature())));
    metrics.add(
        gauge(
            "dissolved_grams_per_litre",
            "Dissolved CO2, estimated.",
            all,
            a -> estimate(a, a.estimate().map(e -> e.dissolvedKgPerM3()).orElse(Double.NaN))));
    metrics.add(
        gauge(
            "dissolved_uncertainty_grams_per_litre",
            "Half width of the 95 % interval of the dissolved CO2.",
            all,
            a -> estimate(a, a.estimate().map(e -> e.dissolvedU95KgPerM3()).orElse(Double.NaN))));
    metrics.add(
        gauge(
            "relief_margin_bar",
            "From the upper end of the reading to the valve's earliest opening.",
            all,
            a -> known(a.margins().map(m -> Unit.BAR.fromSi(m.reliefPa())).orElse(Double.NaN))));
    metrics.add(gauge("reading_age_seconds", "Age of the newest pressure.", all, a -> age(a, now)));
    metrics.add(readings(served));
    metrics.add(alarms(served.book().get(), all));
    metrics.addAll(counts(served.book().get().counts()));
    metrics.addAll(recorder(served.recorder().get()));
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    writer.write(out, new MetricSnapshots(metrics), EscapingScheme.UNDERSCORE_ESCAPING);
    return out.toByteArray();
  }

  private static GaugeSnapshot gauge(
      String name, String help, List<Assessment> all, Function<Assessment, OptionalDouble> value) {
    GaugeSnapshot.Builder builder = GaugeSnapshot.builder().name("tunwarden_" + name).help(help);
    for (Assessment assessment : all) {
      OptionalDouble known = value.apply(assessment);
      if (known.isPresent()) {
        builder.dataPoint(
            point(Labels.of("vessel", assessment.vessel().id()), known.getAsDouble()));
      }
    }
    return builder.build();
  }

  private static GaugeSnapshot.GaugeDataPointSnapshot point(Labels labels, double value) {
    return GaugeSnapshot.GaugeDataPointSnapshot.builder().labels(labels).value(value).build();
  }

  private static CounterSnapshot readings(Served served) {
    CounterSnapshot.Builder builder =
        CounterSnapshot.builder()
            .name("tunwarden_readings")
            .help("Readings and faults that arrived, by grade of quality.");
    served
        .state()
        .counts()
        .forEach(
            (vessel, levels) ->
                levels.forEach(
                    (level, count) -> {
                      String quality = level.name().toLowerCase(Locale.ROOT);
                      builder.dataPoint(
                          CounterSnapshot.CounterDataPointSnapshot.builder()
                              .labels(Labels.of("vessel", vessel, "quality", quality))
                              .value(count)
                              .build());
                    }));
    return builder.build();
  }

  private static GaugeSnapshot alarms(AlarmBook book, List<Assessment> all) {
    GaugeSnapshot.Builder builder =
        GaugeSnapshot.builder()
            .name("tunwarden_alarms")
            .help("Alarms that are not normal, by state; the station's own have no vessel.");
    List<String> vessels = new ArrayList<>(List.of(AlarmBook.STATION));
    all.forEach(assessment -> vessels.add(assessment.vessel().id()));
    for (String vessel : vessels) {
      Map<AlarmState, Integer> counts = new EnumMap<>(AlarmState.class);
      for (Alarm alarm : book.alarms(vessel)) {
        counts.merge(alarm.state(), 1, Integer::sum);
      }
      for (AlarmState state : AlarmState.values()) {
        if (state != AlarmState.NORMAL) {
          Labels labels = Labels.of("vessel", vessel, "state", state.id());
          builder.dataPoint(point(labels, counts.getOrDefault(state, 0)));
        }
      }
    }
    return builder.build();
  }

  private static List<MetricSnapshot> counts(AlarmCounts counts) {
    return List.of(
        CounterSnapshot.builder()
            .name("tunwarden_alarms_raised")
            .help("Alarms raised.")
            .dataPoint(counted(counts.raised()))
            .build(),
        CounterSnapshot.builder()
            .name("tunwarden_alarms_chattered")
            .help("Alarms raised the third time in a minute, or more often.")
            .dataPoint(counted(counts.chattered()))
            .build(),
        CounterSnapshot.builder()
            .name("tunwarden_alarm_floods")
            .help("Times that alarms came faster than a person can follow.")
            .dataPoint(counted(counts.floods()))
            .build());
  }

  private static List<MetricSnapshot> recorder(Served.RecorderFigures figures) {
    return List.of(
        CounterSnapshot.builder()
            .name("tunwarden_records")
            .help("Readings and estimates taken in for recording.")
            .dataPoint(counted(figures.accepted()))
            .build(),
        CounterSnapshot.builder()
            .name("tunwarden_records_dropped")
            .help("Readings and estimates lost to a full queue.")
            .dataPoint(counted(figures.dropped()))
            .build(),
        GaugeSnapshot.builder()
            .name("tunwarden_recording_failing")
            .help("1 while the disk refuses.")
            .dataPoint(point(Labels.EMPTY, figures.failing() ? 1 : 0))
            .build());
  }

  private static CounterSnapshot.CounterDataPointSnapshot counted(long value) {
    return CounterSnapshot.CounterDataPointSnapshot.builder().value(value).build();
  }

  private static OptionalDouble bar(Observed observed) {
    return observed.isUsable()
        ? known(Unit.BAR.fromSi(observed.value().getAsDouble()))
        : OptionalDouble.empty();
  }

  private static OptionalDouble celsius(Observed observed) {
    return observed.isUsable()
        ? known(Unit.CELSIUS.fromSi(observed.value().getAsDouble()))
        : OptionalDouble.empty();
  }

  private static OptionalDouble estimate(Assessment assessment, double value) {
    return assessment.pressure().isUsable() ? known(value) : OptionalDouble.empty();
  }

  private static OptionalDouble age(Assessment assessment, Instant now) {
    return assessment
        .pressure()
        .at()
        .map(at -> known(Math.max(0, Duration.between(at, now).toMillis() / 1000.0)))
        .orElse(OptionalDouble.empty());
  }

  private static OptionalDouble known(double value) {
    return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
  }
}

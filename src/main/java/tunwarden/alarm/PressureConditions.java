package tunwarden.alarm;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.units.Display;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;

/** Alarms told by the pressure reading against the limits the user stated. */
final class PressureConditions {
  /** Without a stated vacuum limit this much below the atmosphere counts, beyond the accuracy. */
  private static final double UNSTATED_VACUUM_PA = 2000;

  private final Assessment assessment;
  private final AlarmSettings settings;
  private final Page page;
  private final Display display;

  private PressureConditions(Assessment assessment, AlarmSettings settings, Page page) {
    this.assessment = assessment;
    this.settings = settings;
    this.page = page;
    this.display = settings.display();
  }

  static List<Condition> of(Assessment assessment, AlarmSettings settings, Page page) {
    PressureConditions conditions = new PressureConditions(assessment, settings, page);
    List<Condition> all = new ArrayList<>();
    all.add(conditions.marginLow());
    all.add(conditions.aboveEarliestLift());
    all.add(conditions.aboveVesselLimit());
    all.add(conditions.vacuum());
    return all;
  }

  private Condition marginLow() {
    AlarmKind kind = AlarmKind.MARGIN_LOW;
    Optional<ReliefSetting> relief = limits().relief();
    if (relief.isEmpty()) {
      return Condition.no(kind);
    }
    Optional<Margins> margins = assessment.margins();
    if (!assessment.pressure().isUsable() || margins.isEmpty()) {
      return Conditions.without(assessment.pressure(), kind);
    }
    double margin = margins.get().reliefPa();
    double limit = settings.marginLowPa() + band(kind);
    boolean yes = !(margin >= limit);
    String text =
        yes
            ? "Relief margin "
                + display.pressureDifference(margin)
                + " is below "
                + display.pressureDifference(settings.marginLowPa())
                + " at "
                + display.gauge(pressure())
                + "; the valve may open from "
                + display.gauge(relief.get().earliestLiftPaGauge())
                + "."
            : "";
    return Conditions.when(yes, kind, text);
  }

  private Condition aboveEarliestLift() {
    AlarmKind kind = AlarmKind.ABOVE_EARLIEST_LIFT;
    return limits()
        .relief()
        .map(relief -> above(kind, relief.earliestLiftPaGauge(), liftWords(relief)))
        .orElse(Condition.no(kind));
  }

  private String liftWords(ReliefSetting relief) {
    return "the earliest lift of the valve set to " + display.gauge(relief.setPaGauge());
  }

  private Condition aboveVesselLimit() {
    AlarmKind kind = AlarmKind.ABOVE_VESSEL_LIMIT;
    return limits().vesselPaGauge().isPresent()
        ? above(kind, limits().vesselPaGauge().getAsDouble(), "what the vessel is rated for")
        : Condition.no(kind);
  }

  private Condition above(AlarmKind kind, double limitPaGauge, String what) {
    if (!assessment.pressure().isUsable()) {
      return Conditions.without(assessment.pressure(), kind);
    }
    boolean yes = !(pressure() < limitPaGauge - band(kind));
    String text =
        yes
            ? "Pressure "
                + display.gauge(pressure())
                + " has reached "
                + display.gauge(limitPaGauge)
                + ", "
                + what
                + "."
            : "";
    return Conditions.when(yes, kind, text);
  }

  private Condition vacuum() {
    AlarmKind kind = AlarmKind.VACUUM;
    if (!assessment.pressure().isUsable()) {
      return Conditions.without(assessment.pressure(), kind);
    }
    double unstated = -UNSTATED_VACUUM_PA - assessment.vessel().accuracy().pressureU95Pa();
    double limit = limits().vacuumPaGauge().orElse(unstated);
    // A vacuum limit is a small number: a quarter of the usual deadband is enough.
    boolean yes = !(pressure() > limit + band(kind) / 4);
    String text =
        yes
            ? "Pressure "
                + display.gauge(pressure())
                + " is below the lowest allowed, "
                + display.gauge(limit)
                + "."
            : "";
    return Conditions.when(yes, kind, text);
  }

  private Limits limits() {
    return assessment.vessel().limits();
  }

  private double pressure() {
    return assessment.pressure().value().orElse(Double.NaN);
  }

  /** How much further a value must go back before an alarm that stands may end. */
  private double band(AlarmKind kind) {
    return page.isActive(kind) ? settings.deadbands().pressurePa() : 0;
  }
}

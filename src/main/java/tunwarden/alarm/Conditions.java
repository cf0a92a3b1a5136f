package tunwarden.alarm;

import java.util.ArrayList;
import java.util.List;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.reading.Quality;

/** What an assessment says about every kind of alarm a vessel can have. */
final class Conditions {
  private Conditions() {}

  /** One condition for each kind that concerns a vessel. */
  static List<Condition> of(Assessment assessment, AlarmSettings settings, Page page) {
    List<Condition> all = new ArrayList<>(PressureConditions.of(assessment, settings, page));
    all.addAll(OutlookConditions.of(assessment, settings, page));
    all.addAll(EventConditions.of(assessment, settings, page));
    all.addAll(InstrumentConditions.of(assessment, settings));
    return all;
  }

  /** Nothing to say without the instrument, and why. */
  static Condition without(Observed instrument, AlarmKind kind) {
    return instrument.quality() == Quality.OUT_OF_SERVICE
        ? Condition.plain(kind, Condition.Truth.SUPPRESSED, "")
        : Condition.unknown(kind);
  }

  static Condition when(boolean yes, AlarmKind kind, String text) {
    return Condition.plain(kind, yes ? Condition.Truth.YES : Condition.Truth.NO, text);
  }
}

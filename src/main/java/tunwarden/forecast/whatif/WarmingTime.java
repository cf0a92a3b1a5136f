package tunwarden.forecast.whatif;

import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.WarmingHabit;
import tunwarden.forecast.Words;
import tunwarden.vessel.Prospects;

/**
 * How fast a vessel warms with cooling lost.
 *
 * @param timeS time constant with its range, s
 * @param words where it is from
 */
record WarmingTime(Spread timeS, String words) {
  private static final DateTimeFormatter DAY =
      DateTimeFormatter.ofPattern("yyyy-MM-dd", Locale.ROOT).withZone(ZoneOffset.UTC);

  /** The stated one, else the learnt one. */
  static Optional<WarmingTime> of(Prospects told, WarmingHabit habit) {
    if (told.warmingS().isPresent()) {
      double stated = told.warmingS().getAsDouble();
      return Optional.of(
          new WarmingTime(
              new Spread(stated, stated, stated),
              "time constant " + Words.time(stated) + " as stated"));
    }
    return habit.learnt().map(WarmingTime::of);
  }

  private static WarmingTime of(WarmingHabit.Learnt learnt) {
    Spread time = learnt.timeS();
    return new WarmingTime(
        time,
        "time constant "
            + Words.time(time.middle())
            + " ("
            + Words.time(time.low())
            + " to "
            + Words.time(time.high())
            + "), learnt from its warming from "
            + Words.celsius(learnt.fromK())
            + " to "
            + Words.celsius(learnt.toK())
            + " on "
            + DAY.format(learnt.from()));
  }
}

package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.assess.Margins;
import tunwarden.assess.Observed;
import tunwarden.reading.Quality;
import tunwarden.screen.model.AlarmList;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.VesselBoard;

/**
 * How a vessel stands at a glance.
 *
 * @param mood whether a person must look
 * @param word why, in one or two words; empty when calm
 * @param stale whether the pressure is too old or unusable
 * @param age age of the pressure; empty when there never was one
 */
record Standing(Mood mood, String word, boolean stale, Optional<Duration> age) {
  static Standing of(VesselBoard vessel, Board board) {
    Observed pressure = vessel.assessment().pressure();
    Optional<Duration> age = age(pressure, board.now());
    boolean stale = isStale(pressure, board);
    Mood mood = stale ? Mood.CAUTION : Mood.CALM;
    String word = stale ? (age.isEmpty() ? "no reading" : "STALE") : "";
    Optional<Alarm> worst = AlarmList.worstOf(vessel);
    if (worst.isPresent() && Mood.of(worst.get().priority()).compareTo(mood) > 0) {
      mood = Mood.of(worst.get().priority());
      word = worst.get().kind().word();
    }
    Optional<Margins> margins = vessel.assessment().margins();
    if (!stale && margins.isPresent() && margins.get().reliefPa() <= 0 && mood != Mood.DANGER) {
      return new Standing(Mood.DANGER, "past earliest lift", false, age);
    }
    return new Standing(mood, word, stale, age);
  }

  static boolean isStale(Observed observed, Board board) {
    Optional<Duration> age = age(observed, board.now());
    return age.isEmpty()
        || observed.quality() == Quality.STALE
        || observed.quality().isBad()
        || age.get().compareTo(board.staleAfter()) > 0;
  }

  static Optional<Duration> age(Observed observed, Instant now) {
    return observed.at().map(at -> at.isAfter(now) ? Duration.ZERO : Duration.between(at, now));
  }
}

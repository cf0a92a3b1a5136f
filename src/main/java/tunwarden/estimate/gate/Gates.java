package tunwarden.estimate.gate;

import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/** All gates in order: quality on arrival, range, time, rate, stuck. */
public final class Gates {
  private Gates() {}

  /** Judges one reading against what is remembered about its quantity. */
  public static Verdict judge(Track track, Reading reading) {
    long time = reading.time().toEpochMilli();
    double value = reading.value();
    if (reading.quality().isBad()) {
      return refused(reading.quality(), reading.quality().why(), track);
    }
    if (!RangeGate.accepts(reading.quantity(), value)) {
      return refused(Quality.OUT_OF_RANGE, Quality.OUT_OF_RANGE.why(), track);
    }
    String disorder = TimeGate.against(track, time);
    if (!disorder.isEmpty()) {
      return disordered(track, reading, disorder);
    }
    double seconds = (time - track.timeMs()) / 1000.0;
    boolean slow =
        !track.seen() || RateGate.accepts(reading.quantity(), value - track.value(), seconds);
    if (!slow && !confirms(track, reading)) {
      Track stray = track.stray(time, value, false);
      return refused(Quality.TOO_FAST, Quality.TOO_FAST.why(), stray);
    }
    Track next = track.accept(time, value);
    return judgeStillness(reading.quantity(), next, reading.quality());
  }

  private static Verdict judgeStillness(Quantity quantity, Track next, Quality arrived) {
    boolean watched = quantity == Quantity.PRESSURE || quantity == Quantity.TEMPERATURE;
    if (watched && !StuckGate.accepts(next)) {
      return new Verdict(Quality.STUCK, Quality.STUCK.why(), false, next);
    }
    return new Verdict(arrived, arrived == Quality.GOOD ? "" : arrived.why(), true, next);
  }

  private static boolean confirms(Track track, Reading reading) {
    double seconds = (reading.time().toEpochMilli() - track.strayMs()) / 1000.0;
    return track.strays() > 0
        && RateGate.accepts(reading.quantity(), reading.value() - track.strayValue(), seconds);
  }

  private static Verdict disordered(Track track, Reading reading, String why) {
    long time = reading.time().toEpochMilli();
    boolean agrees = TimeGate.agrees(track, time);
    Track stray = track.stray(time, reading.value(), agrees);
    if (stray.strays() >= TimeGate.PROOF) {
      return new Verdict(Quality.GOOD, "", true, Track.EMPTY.accept(time, reading.value()));
    }
    return refused(Quality.OUT_OF_ORDER, why, stray);
  }

  private static Verdict refused(Quality quality, String why, Track track) {
    return new Verdict(quality, why, false, track);
  }
}

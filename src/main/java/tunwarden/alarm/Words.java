package tunwarden.alarm;

import java.time.Duration;

/** Times as people say them. */
final class Words {
  private Words() {}

  /** {@code 5 h 20 min}, {@code 40 min}, {@code 12 s}, {@code 3 d 4 h}. */
  static String duration(Duration duration) {
    long seconds = Math.max(0, duration.toSeconds());
    if (seconds < 60) {
      return seconds + " s";
    }
    long minutes = (seconds + 30) / 60;
    if (minutes < 60) {
      return minutes + " min";
    }
    long hours = minutes / 60;
    if (hours < 48) {
      return hours + " h" + (minutes % 60 == 0 ? "" : " " + minutes % 60 + " min");
    }
    return hours / 24 + " d" + (hours % 24 == 0 ? "" : " " + hours % 24 + " h");
  }
}

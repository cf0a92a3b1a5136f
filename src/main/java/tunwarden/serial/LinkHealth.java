package tunwarden.serial;

import java.time.Instant;
import java.util.List;
import java.util.Map;
import tunwarden.reading.Sample;
import tunwarden.wire.profile.Binding;

/**
 * One immutable picture of how a line is doing, for the signals page.
 *
 * @param port name of the port
 * @param state how it is doing
 * @param detail a sentence on the state; may be empty
 * @param since when it came into this state
 * @param traffic what has passed
 * @param channels every value read over it
 */
public record LinkHealth(
    String port,
    LinkState state,
    String detail,
    Instant since,
    Traffic traffic,
    List<Channel> channels) {
  /**
   * What has passed over the line since the start.
   *
   * @param bytes received
   * @param messages lines or answers understood
   * @param bytesDropped received but belonging to no message that was read
   * @param lastBytesAt when the last bytes came; null before the first
   * @param lastBytes the last bytes, made printable
   * @param troubles how often each has happened
   * @param lastTrouble the latest, as a sentence; empty before the first
   * @param lastTroubleAt when; null before the first
   */
  public record Traffic(
      long bytes,
      long messages,
      long bytesDropped,
      Instant lastBytesAt,
      String lastBytes,
      Map<Trouble, Long> troubles,
      String lastTrouble,
      Instant lastTroubleAt) {}

  /**
   * One value read over the line.
   *
   * @param binding what it is
   * @param latest last reading or fault; null before the first
   * @param shown the value as decoded, with its unit; empty without one
   * @param periodS smoothed time between values, s; NaN before the second
   */
  public record Channel(Binding binding, Sample latest, String shown, double periodS) {}
}

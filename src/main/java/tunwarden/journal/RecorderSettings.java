package tunwarden.journal;

import java.time.Duration;

/**
 * How recording behaves. Defaults suit a shop PC.
 *
 * @param flush longest time a reading waits in memory
 * @param queue readings that may wait; more are dropped and counted
 * @param estimateEvery how often the estimate of a vessel is recorded
 * @param retry how long to wait before a failed disk is tried again
 * @param keep what is kept
 * @param resumeWithin how old a saved estimate may be to go on from it
 */
public record RecorderSettings(
    Duration flush,
    int queue,
    Duration estimateEvery,
    Duration retry,
    Keep keep,
    Duration resumeWithin) {
  /**
   * Five seconds, an hour's worth of a small cellar in memory, a minute, half a minute; a night's
   * silence is bridged, a week's is not.
   */
  public static final RecorderSettings USUAL =
      new RecorderSettings(
          Duration.ofSeconds(5),
          1 << 16,
          Duration.ofMinutes(1),
          Duration.ofSeconds(30),
          Keep.USUAL,
          Duration.ofHours(6));

  /**
   * What is kept on the disk.
   *
   * @param days closed days are deleted after this many
   * @param bytes size of all closed days together beyond which the oldest are deleted
   * @param leastFreeBytes room that is left to the rest of the computer
   * @param mayDeleteForRoom whether the oldest closed days may go to make room; else recording
   *     stops until there is room again
   */
  public record Keep(int days, long bytes, long leastFreeBytes, boolean mayDeleteForRoom) {
    /** Two years, four gigabytes, a hundred megabytes free. */
    public static final Keep USUAL = new Keep(730, 4L << 30, 100L << 20, true);
  }

  public RecorderSettings withFlush(Duration other) {
    return new RecorderSettings(other, queue, estimateEvery, retry, keep, resumeWithin);
  }

  public RecorderSettings withKeep(Keep other) {
    return new RecorderSettings(flush, queue, estimateEvery, retry, other, resumeWithin);
  }

  public RecorderSettings withResumeWithin(Duration other) {
    return new RecorderSettings(flush, queue, estimateEvery, retry, keep, other);
  }
}

package tunwarden.config;

import java.time.Duration;
import java.util.Optional;
import tunwarden.journal.RecorderSettings;

/** The {@code [recording]} table. */
final class RecordingReader {
  private static final int MOST_DAYS = 36_500;
  private static final int MOST_MEGABYTES = 10_000_000;

  private RecordingReader() {}

  static RecorderSettings read(Section recording) {
    RecorderSettings usual = RecorderSettings.USUAL;
    RecorderSettings.Keep keep = usual.keep();
    Optional<Duration> flush = recording.parsed("flush", ReadingsReader::duration);
    RecorderSettings.Keep stated =
        new RecorderSettings.Keep(
            recording.whole("keep-days", 1, MOST_DAYS).orElse(keep.days()),
            megabytes(recording, "keep-megabytes").orElse(keep.bytes()),
            megabytes(recording, "leave-free-megabytes").orElse(keep.leastFreeBytes()),
            recording.flag("delete-oldest-for-room").orElse(keep.mayDeleteForRoom()));
    Optional<Duration> resume = recording.parsed("resume-within", ReadingsReader::duration);
    recording.close();
    return usual
        .withFlush(flush.orElse(usual.flush()))
        .withKeep(stated)
        .withResumeWithin(resume.orElse(usual.resumeWithin()));
  }

  private static Optional<Long> megabytes(Section recording, String key) {
    return recording.whole(key, 1, MOST_MEGABYTES).map(count -> (long) count << 20);
  }
}

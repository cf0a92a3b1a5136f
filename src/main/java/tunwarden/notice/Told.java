package tunwarden.notice;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.concurrent.ConcurrentHashMap;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.Disk;

/**
 * Up to which journal entry word is safe in the outbox of every channel, kept in a file. What is in
 * the journal beyond it when the program starts, nobody was told of.
 */
final class Told {
  private static final Logger LOG = LoggerFactory.getLogger(Told.class);

  private final Disk disk;
  private final Path file;
  private final Map<String, Long> byChannel = new ConcurrentHashMap<>();

  Told(Disk disk, Path folder, List<String> channels) {
    this.disk = disk;
    this.file = folder.resolve("told");
    channels.forEach(channel -> byChannel.put(channel, 0L));
  }

  /** Empty before anything was told. */
  OptionalLong upTo() throws IOException {
    if (!disk.exists(file)) {
      return OptionalLong.empty();
    }
    try (InputStream in = disk.read(file)) {
      String text = new String(in.readNBytes(32), StandardCharsets.US_ASCII).strip();
      return text.matches("\\d{1,18}")
          ? OptionalLong.of(Long.parseLong(text))
          : OptionalLong.empty();
    }
  }

  /** A channel has stored word of all entries up to that number. */
  synchronized void stored(String channel, long number) {
    long before = least();
    byChannel.put(channel, number);
    long now = least();
    if (now == before) {
      return;
    }
    try {
      AtomicFile.write(disk, file, (now + "\n").getBytes(StandardCharsets.US_ASCII));
    } catch (IOException e) {
      LOG.warn("what was told could not be noted: {}", e.toString());
    }
  }

  private long least() {
    return byChannel.values().stream().mapToLong(Long::longValue).min().orElse(0);
  }
}

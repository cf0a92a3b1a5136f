package tunwarden.notice;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.Disk;

/**
 * Messages of one channel that are not delivered yet, one file each, so that a restart or a power
 * cut forgets none. Used by one thread.
 */
final class Outbox {
  /** More undelivered messages than this are not kept: the oldest goes. */
  static final int MOST = 200;

  private static final ObjectMapper JSON = JsonMapper.builder().build();

  private final Disk disk;
  private final Path folder;
  private long next;

  /** A message that waits, and its file. */
  record Waiting(Path file, Message message) {}

  Outbox(Disk disk, Path folder) throws IOException {
    this.disk = disk;
    this.folder = folder;
    disk.createDirectories(folder);
    List<Path> files = files();
    this.next = files.isEmpty() ? 1 : number(files.get(files.size() - 1)) + 1;
  }

  /** Keeps a message; tells whether an older one had to go for it. */
  boolean add(Message message) throws IOException {
    byte[] content = message.json().toString().getBytes(StandardCharsets.UTF_8);
    AtomicFile.write(disk, folder.resolve(String.format("%010d.json", next++)), content);
    List<Path> files = files();
    if (files.size() > MOST) {
      disk.delete(files.get(0));
      return true;
    }
    return false;
  }

  /** The oldest that waits; a file that cannot be understood is removed. */
  Optional<Waiting> oldest() throws IOException {
    for (Path file : files()) {
      Optional<Message> message = read(file);
      if (message.isPresent()) {
        return Optional.of(new Waiting(file, message.get()));
      }
      disk.delete(file);
    }
    return Optional.empty();
  }

  void remove(Waiting waiting) throws IOException {
    disk.delete(waiting.file());
    disk.syncDirectory(folder);
  }

  int size() throws IOException {
    return files().size();
  }

  private List<Path> files() throws IOException {
    List<Path> files = new ArrayList<>(disk.list(folder));
    files.removeIf(file -> !file.getFileName().toString().matches("\\d{10}\\.json"));
    return files;
  }

  private static long number(Path file) {
    return Long.parseLong(file.getFileName().toString().substring(0, 10));
  }

  private Optional<Message> read(Path file) throws IOException {
    try (InputStream in = disk.read(file)) {
      JsonNode node = JSON.readTree(in);
      if (node instanceof ObjectNode && node.path("alarms") instanceof ArrayNode alarms) {
        return Optional.of(
            new Message(
                Instant.parse(node.path("time").asText()),
                node.path("subject").asText(),
                node.path("text").asText(),
                alarms));
      }
      return Optional.empty();
    } catch (JsonProcessingException | DateTimeException notOurs) {
      return Optional.empty();
    }
  }
}

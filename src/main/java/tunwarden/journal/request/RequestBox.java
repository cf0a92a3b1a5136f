package tunwarden.journal.request;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.UUID;
import java.util.concurrent.TimeUnit;
import java.util.function.Function;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.Disk;

/** The folder in which requests are left, and answered beside. */
public final class RequestBox {
  private static final String NAME = "[0-9a-f-]{36}\\.json";
  private static final int LARGEST = 8192;
  private static final int MOST_AT_ONCE = 50;
  private static final int LOOK_MS = 50;

  /** A request that waited longer was given up by the person who asked. */
  private static final Duration FORGOTTEN = Duration.ofMinutes(1);

  private final Disk disk;
  private final Path folder;

  /** A box in {@code DATA/requests}. */
  public RequestBox(Disk disk, Path folder) {
    this.disk = disk;
    this.folder = folder;
  }

  /**
   * Leaves a request and waits for what becomes of it.
   *
   * @return empty when nobody answered in that time; the request is taken back then
   */
  public Optional<Reply> ask(Request request, Duration patience) throws IOException {
    Path file = folder.resolve(UUID.randomUUID() + ".json");
    Path answer = answer(file);
    AtomicFile.write(disk, file, request.bytes());
    long end = System.nanoTime() + patience.toNanos();
    try {
      while (!disk.exists(answer)) {
        if (System.nanoTime() - end > 0) {
          return Optional.empty();
        }
        TimeUnit.MILLISECONDS.sleep(LOOK_MS);
      }
      return Optional.of(Reply.of(new String(read(answer), StandardCharsets.UTF_8)));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return Optional.empty();
    } finally {
      disk.delete(file);
      disk.delete(answer);
    }
  }

  /** Carries out what waits, oldest name first, and removes what nobody fetched. */
  public void serve(Instant now, Function<Request, Reply> deeds) throws IOException {
    int served = 0;
    for (Path file : disk.list(folder)) {
      String name = file.getFileName().toString();
      if (name.matches(NAME) && served < MOST_AT_ONCE) {
        served++;
        Reply reply = reply(file, now, deeds);
        AtomicFile.write(disk, answer(file), reply.line().getBytes(StandardCharsets.UTF_8));
        disk.delete(file);
      } else if (name.endsWith(".answer") && isForgotten(file)) {
        disk.delete(file);
      }
    }
  }

  private Reply reply(Path file, Instant now, Function<Request, Reply> deeds) {
    try {
      Request request = Request.read(read(file));
      if (Duration.between(request.asked(), now).abs().compareTo(FORGOTTEN) > 0) {
        return Reply.refused("the request is older than a minute; ask again");
      }
      return deeds.apply(request);
    } catch (IOException | IllegalArgumentException bad) {
      return Reply.refused(bad.getMessage());
    }
  }

  /** A link, which might lead anywhere, is not followed. */
  private byte[] read(Path file) throws IOException {
    if (!Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS) || disk.size(file) > LARGEST) {
      throw new IOException("this is no request");
    }
    try (InputStream in = disk.read(file)) {
      return in.readNBytes(LARGEST);
    }
  }

  private static boolean isForgotten(Path file) throws IOException {
    Instant written = Files.getLastModifiedTime(file, LinkOption.NOFOLLOW_LINKS).toInstant();
    Duration age = Duration.between(written, Instant.now());
    return age.compareTo(FORGOTTEN) > 0;
  }

  private static Path answer(Path file) {
    String name = file.getFileName().toString();
    return file.resolveSibling(name.substring(0, name.length() - ".json".length()) + ".answer");
  }
}

package tunwarden.replay;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.LongConsumer;
import java.util.zip.GZIPInputStream;
import tunwarden.replay.layout.Layout;
import tunwarden.replay.layout.LayoutException;
import tunwarden.replay.layout.LayoutFinder;
import tunwarden.replay.layout.SampledLine;
import tunwarden.replay.text.Encoding;
import tunwarden.replay.text.Line;
import tunwarden.replay.text.LineSource;

/** A log on disk, plain or gzip, whose head has been looked at; can be read any number of times. */
public final class LogFile implements RowSource.Supplier {
  private static final int HEAD_BYTES = 1 << 16;
  private static final int HEAD_LINES = 400;
  private static final int BUFFER = 1 << 16;

  private final Path path;
  private final LogOptions options;
  private final Charset charset;
  private final Layout layout;
  private LongConsumer progress = bytes -> {};

  private LogFile(Path path, LogOptions options, Charset charset, Layout layout) {
    this.path = path;
    this.options = options;
    this.charset = charset;
    this.layout = layout;
  }

  /**
   * Looks at the head of a log and settles how to read it.
   *
   * @throws BadLogException when it cannot be read or is no log; the message is for the user
   */
  public static LogFile open(Path path, LogOptions options) {
    String name = path.toString();
    try {
      byte[] head = head(path);
      if (head.length == 0) {
        throw new BadLogException(name, 0, "", "the file is empty");
      }
      Encoding encoding = Encoding.guess(head, head.length == HEAD_BYTES);
      List<SampledLine> lines = lines(head, encoding.charset());
      Layout layout = LayoutFinder.find(lines, options.columns(), options.zone(), encoding.guess());
      return new LogFile(path, options, encoding.charset(), layout);
    } catch (LayoutException bad) {
      throw new BadLogException(name, bad.line(), bad.field(), bad.getMessage());
    } catch (NoSuchFileException missing) {
      throw new BadLogException(name, 0, "", "there is no such file");
    } catch (IOException failed) {
      throw new BadLogException(name, 0, "", "it cannot be read: " + reason(failed));
    }
  }

  private static String reason(IOException failed) {
    return failed.getMessage() == null ? failed.getClass().getSimpleName() : failed.getMessage();
  }

  private static byte[] head(Path path) throws IOException {
    if (Files.isDirectory(path)) {
      throw new IOException("it is a folder; name a file in it");
    }
    try (InputStream in = unzipped(Files.newInputStream(path))) {
      return in.readNBytes(HEAD_BYTES);
    }
  }

  private static InputStream unzipped(InputStream raw) throws IOException {
    BufferedInputStream in = new BufferedInputStream(raw, BUFFER);
    in.mark(2);
    boolean gzip = in.read() == 0x1f && in.read() == 0x8b;
    in.reset();
    return gzip ? new GZIPInputStream(in, BUFFER) : in;
  }

  private static List<SampledLine> lines(byte[] head, Charset charset) throws IOException {
    List<SampledLine> lines = new ArrayList<>();
    InputStream bytes = Encoding.withoutMark(new java.io.ByteArrayInputStream(head));
    try (LineSource source = new LineSource(new InputStreamReader(bytes, charset))) {
      Line line = new Line();
      while (lines.size() < HEAD_LINES && source.next(line)) {
        if (line.isTerminated() || head.length < HEAD_BYTES) {
          lines.add(new SampledLine(line.number(), line.text()));
        }
      }
    }
    return lines;
  }

  /** How the log is read. */
  public Layout layout() {
    return layout;
  }

  public Path path() {
    return path;
  }

  /** Size on disk, in bytes; the whole to which progress counts. */
  public long size() throws IOException {
    return Files.size(path);
  }

  /** Has every further pass report how many bytes of the file it has taken in so far. */
  public LogFile reportingTo(LongConsumer bytesRead) {
    LogFile same = new LogFile(path, options, charset, layout);
    same.progress = bytesRead;
    return same;
  }

  @Override
  public LogReader open() throws IOException {
    return open(new MeteredInput(Files.newInputStream(path), progress));
  }

  /** As {@link #open}, for a reader that can tell the file's hash when it is done. */
  public LogReader openHashed() throws IOException {
    return open(new HashedInput(Files.newInputStream(path), progress));
  }

  private LogReader open(MeteredInput raw) throws IOException {
    InputStream text = Encoding.withoutMark(unzipped(raw));
    LineSource lines = new LineSource(new InputStreamReader(text, charset));
    return new LogReader(path.toString(), layout, options, lines, raw::hash);
  }
}

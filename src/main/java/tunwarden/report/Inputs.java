package tunwarden.report;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import tunwarden.report.story.Chapter;

/** Names and hashes of the files a report is made from, so that it can be made again. */
public final class Inputs {
  private static final int BUFFER = 1 << 16;

  private Inputs() {}

  /** The file with its SHA-256. */
  public static Chapter.Input of(Path file) throws IOException {
    try (InputStream in = Files.newInputStream(file)) {
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      byte[] buffer = new byte[BUFFER];
      for (int got = in.read(buffer); got >= 0; got = in.read(buffer)) {
        digest.update(buffer, 0, got);
      }
      return new Chapter.Input(file.toString(), HexFormat.of().formatHex(digest.digest()));
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException(impossible);
    }
  }
}

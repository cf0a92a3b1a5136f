package tunwarden.app.headless;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.notice.Channel;
import tunwarden.notice.Message;
import tunwarden.units.BadInputException;

/** Sends a test by every way the cellar file names. */
public final class NoticeTrial {
  private NoticeTrial() {}

  /**
   * Sends and says what became of it.
   *
   * @return whether every way worked
   * @throws BadInputException when the cellar file names none
   */
  public static boolean run(Path cellarFile, Instant now, PrintWriter out) throws IOException {
    Cellar cellar = CellarFile.read(cellarFile);
    List<Channel> channels = Channels.of(cellar, System.getenv());
    if (channels.isEmpty()) {
      throw new BadInputException(
          cellarFile
              + ": nobody is told of alarms; add a [notice] table with command, mail or"
              + " webhook.");
    }
    boolean all = true;
    for (Channel channel : channels) {
      try {
        channel.send(Message.test(now));
        out.println(channel.name() + ": sent");
      } catch (IOException failed) {
        all = false;
        out.println(channel.name() + ": NOT sent: " + failed.getMessage());
      }
      out.flush();
    }
    return all;
  }
}

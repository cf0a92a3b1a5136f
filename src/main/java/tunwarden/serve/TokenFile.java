package tunwarden.serve;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import tunwarden.units.BadInputException;

/** Reads the token that others must give from a file, so that it stands on no command line. */
public final class TokenFile {
  private static final int SHORTEST = 16;
  private static final long LARGEST_FILE = 4096;

  private TokenFile() {}

  /**
   * The token: the file without blanks around it.
   *
   * @throws BadInputException when it cannot be read or is too short to be kept from guessing
   */
  public static String read(Path file) {
    try {
      String token = Files.size(file) <= LARGEST_FILE ? Files.readString(file).strip() : "";
      if (token.length() < SHORTEST || !token.matches("[!-~]+")) {
        throw new BadInputException(
            file
                + ": a token is one line of at least "
                + SHORTEST
                + " printable characters without blanks.");
      }
      return token;
    } catch (IOException unreadable) {
      throw new BadInputException(
          "The token file " + file + " cannot be read; check its name and mode.", unreadable);
    }
  }
}

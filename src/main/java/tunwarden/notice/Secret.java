package tunwarden.notice;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import tunwarden.units.BadInputException;

/** A password or token. Never printed: its text form is stars. */
public final class Secret {
  private static final long LARGEST_FILE = 4096;
  private final String value;

  private Secret(String value) {
    this.value = value;
  }

  static Secret of(String value) {
    return new Secret(value);
  }

  /**
   * The secret from the file if one is named, else from the environment, else none.
   *
   * @param file named in the cellar file
   * @param variable name in the environment
   * @throws BadInputException when the file cannot be read or is empty
   */
  public static Optional<Secret> find(
      Optional<Path> file, String variable, Map<String, String> environment) {
    if (file.isEmpty()) {
      return Optional.ofNullable(environment.get(variable)).map(Secret::new);
    }
    Path path = file.get();
    try {
      String text = Files.size(path) <= LARGEST_FILE ? Files.readString(path).strip() : "";
      if (text.isEmpty() || text.indexOf('\n') >= 0) {
        throw new BadInputException(
            path + ": a secret is one line, not " + Files.size(path) + " bytes of something else.");
      }
      return Optional.of(new Secret(text));
    } catch (IOException unreadable) {
      throw new BadInputException(
          "The secret in " + path + " cannot be read; check its name and mode.", unreadable);
    }
  }

  /** The secret itself, for the one place that must send it. */
  String reveal() {
    return value;
  }

  @Override
  public String toString() {
    return "***";
  }
}

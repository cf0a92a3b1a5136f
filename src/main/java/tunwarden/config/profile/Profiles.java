package tunwarden.config.profile;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tunwarden.units.BadInputException;
import tunwarden.wire.profile.Profile;

/**
 * Finds device profiles by name: first as a file, given with its ending; then in the folder {@code
 * devices} beside the cellar file; then among those that come with the program.
 */
public final class Profiles {
  /** Names of the profiles that come with the program. */
  public static final List<String> SHIPPED =
      List.of(
          "text-line",
          "text-query",
          "text-query-addressed",
          "modbus-rtu-float",
          "modbus-rtu-scaled",
          "current-loop",
          "pt100",
          "checksummed-line",
          "checksummed-line-crc");

  private static final String FOLDER = "devices";
  private static final String ENDING = ".json";
  private static final int LARGEST_BYTES = 1 << 20;

  private Profiles() {}

  /**
   * The profile of that name.
   *
   * @param device a name such as {@code text-line}, or a file ending in {@code .json}
   * @param beside the folder of the cellar file, or the working directory
   * @throws BadInputException when there is none, or it is wrong
   */
  public static Profile find(String device, Path beside) {
    if (device.endsWith(ENDING)) {
      return ofFile(beside.resolve(device));
    }
    Path own = beside.resolve(FOLDER).resolve(device + ENDING);
    if (Files.isRegularFile(own)) {
      return ofFile(own);
    }
    if (SHIPPED.contains(device)) {
      return shipped(device);
    }
    throw new BadInputException(
        "there is no device profile '"
            + device
            + "'; there are "
            + String.join(", ", SHIPPED)
            + ", and files of your own in "
            + beside.resolve(FOLDER));
  }

  /** Every profile that can be named: those beside the cellar file, then the shipped ones. */
  public static Map<String, Profile> all(Path beside) {
    Map<String, Profile> all = new LinkedHashMap<>();
    SHIPPED.forEach(name -> all.put(name, find(name, beside)));
    Path folder = beside.resolve(FOLDER);
    if (Files.isDirectory(folder)) {
      try (var files = Files.list(folder)) {
        files
            .map(file -> file.getFileName().toString())
            .filter(name -> name.endsWith(ENDING) && !name.contains(".schema."))
            .sorted()
            .map(name -> name.substring(0, name.length() - ENDING.length()))
            .forEach(name -> all.computeIfAbsent(name, n -> find(n, beside)));
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
    return all;
  }

  /**
   * Reads a profile from a file.
   *
   * @throws BadInputException when it cannot be read or is wrong
   */
  public static Profile ofFile(Path file) {
    try {
      if (Files.size(file) > LARGEST_BYTES) {
        throw new BadInputException(file + " is too large to be a device profile");
      }
      return ProfileReader.read(Files.readString(file), file.toString());
    } catch (IOException e) {
      throw new BadInputException(
          "the device profile " + file + " cannot be read; check its name, mode and encoding", e);
    }
  }

  /** The text of a shipped profile, to start one's own from. */
  public static String shippedText(String name) {
    String resource = "/" + FOLDER + "/" + name + ENDING;
    try (InputStream stream = Profiles.class.getResourceAsStream(resource)) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Profile shipped(String name) {
    return ProfileReader.read(shippedText(name), name);
  }
}

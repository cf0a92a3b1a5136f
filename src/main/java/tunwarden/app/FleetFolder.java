package tunwarden.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import tunwarden.units.BadInputException;

/**
 * The logs in a folder, as bundles that belong together: every log that lies in it is one, and so
 * are all logs of a folder in it, as the recorder keeps them by vessel.
 */
final class FleetFolder {
  private FleetFolder() {}

  /**
   * Logs that belong together.
   *
   * @param name the folder's name, or the log's without its ending
   * @param logs at least one
   */
  record Bundle(String name, List<Path> logs) {}

  /**
   * The bundles in order of their names.
   *
   * @throws BadInputException when the folder holds none
   */
  static List<Bundle> bundles(Path folder) throws IOException {
    List<Bundle> bundles = new ArrayList<>();
    for (Path entry : sorted(folder)) {
      if (Files.isDirectory(entry)) {
        List<Path> logs = sorted(entry).stream().filter(FleetFolder::isLog).toList();
        if (!logs.isEmpty()) {
          bundles.add(new Bundle(entry.getFileName().toString(), logs));
        }
      } else if (isLog(entry)) {
        String name = entry.getFileName().toString().replaceFirst("\\.csv(\\.gz)?$", "");
        bundles.add(new Bundle(name, List.of(entry)));
      }
    }
    if (bundles.isEmpty()) {
      throw new BadInputException(
          folder
              + ": it holds no logs; they end in .csv or .csv.gz, in it or in folders by vessel");
    }
    return bundles;
  }

  private static boolean isLog(Path path) {
    String name = path.getFileName().toString();
    return Files.isRegularFile(path) && (name.endsWith(".csv") || name.endsWith(".csv.gz"));
  }

  private static List<Path> sorted(Path folder) throws IOException {
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.sorted().toList();
    }
  }
}

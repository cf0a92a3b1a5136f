package tunwarden.config;

import java.nio.file.Path;

/** Cellar texts that tests spoil in one place. */
final class Cellars {
  static final Path FILE = Path.of("cellar.toml");

  /** Everything required and nothing else. */
  static final String LEAST =
      """
      [vessel.FV2]
      volume = "2000 L"
      fill = "1800 L"
      liquid = "beer"
      limits = { relief = "1.5 bar" }

      [vessel.FV2.readings]
      pressure = { device = "text-line", port = "/dev/ttyUSB0", field = "P" }
      temperature = { device = "text-line", port = "/dev/ttyUSB0", field = "T" }
      """;

  private Cellars() {}

  static Cellar parse(String text) {
    return CellarFile.parse(FILE, text);
  }
}

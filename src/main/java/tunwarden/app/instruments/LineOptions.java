package tunwarden.app.instruments;

import java.time.Duration;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;
import tunwarden.wire.profile.LineSettings;

/** Which port, at which settings. */
final class LineOptions {
  @Parameters(paramLabel = "PORT", description = "Serial port; see 'instruments ports'.")
  private String port;

  @Option(names = "--baud", paramLabel = "N", description = "Speed, bit/s. Default: 9600.")
  private int baud = LineSettings.USUAL.baud();

  @Option(
      names = "--parity",
      paramLabel = "P",
      description = "One of ${COMPLETION-CANDIDATES}. Default: NONE.")
  private LineSettings.Parity parity = LineSettings.Parity.NONE;

  @Option(names = "--stop-bits", paramLabel = "N", description = "1 or 2. Default: 1.")
  private int stopBits = 1;

  String port() {
    return port;
  }

  LineSettings settings() {
    if (baud < 50 || baud > 4_000_000 || stopBits < 1 || stopBits > 2) {
      throw new BadInputException("--baud must be 50 to 4000000 and --stop-bits 1 or 2");
    }
    LineSettings usual = LineSettings.USUAL;
    return new LineSettings(baud, 8, parity, stopBits, usual.flow(), usual.wires(), usual.settle());
  }

  /** A time span as people write it, {@code 10 s}. */
  static Duration span(String text) {
    double seconds = Quantities.parse(text, Kind.DURATION);
    if (!(seconds > 0 && seconds <= 1e9)) {
      throw new BadInputException("'" + text + "' is no time to wait; write one such as '10 s'");
    }
    return Duration.ofNanos(Math.round(seconds * 1e9));
  }
}

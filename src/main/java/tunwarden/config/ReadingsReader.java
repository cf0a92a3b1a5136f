package tunwarden.config;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Quantity;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.wire.signal.Calibration;

/** The {@code [vessel.….readings]} table: which instrument gives which quantity. */
final class ReadingsReader {
  private static final String EXAMPLE =
      "{ device = \"text-line\", port = \"/dev/ttyUSB0\", field = \"P\" }";

  /** Behind a quantity's word: a second instrument that only vouches for the first. */
  static final String CHECK = "-check";

  private static final String TWO_POINTS = "0.02 bar = 0 bar, 2.05 bar = 2 bar";

  private ReadingsReader() {}

  static List<Instrument> read(Section vessel, String id) {
    Section readings = vessel.section("readings");
    if (!vessel.has("readings")) {
      vessel.require("readings", "{ pressure = " + EXAMPLE + ", temperature = … }");
      return List.of();
    }
    List<Instrument> found = new ArrayList<>();
    for (Quantity quantity : Quantity.values()) {
      for (String key : List.of(quantity.word(), quantity.word() + CHECK)) {
        if (readings.has(key)) {
          found.add(instrument(readings.section(key), id, quantity, key.endsWith(CHECK)));
        }
      }
    }
    readings.require(Quantity.PRESSURE.word(), EXAMPLE);
    readings.require(Quantity.TEMPERATURE.word(), EXAMPLE);
    readings.close();
    return found;
  }

  /** One instrument's table. */
  static Instrument instrument(Section section, String vessel, Quantity quantity, boolean check) {
    Optional<String> device = section.text("device");
    Optional<String> port = section.text("port");
    Optional<String> field = section.text("field");
    section.require("device", "\"text-line\"");
    section.require("port", "\"/dev/ttyUSB0\"");
    section.require("field", "\"P\"");
    Instrument instrument =
        new Instrument(
            vessel,
            quantity,
            device.orElse(""),
            port.orElse(""),
            field.orElse(""),
            section.whole("address", 1, 247),
            section.parsed("every", ReadingsReader::duration),
            section.whole("baud", 300, 4_000_000),
            new Instrument.Worth(
                accuracy(section, quantity.kind()),
                section.parsed("calibration", text -> calibration(text, quantity.kind())),
                check,
                section.text("out-of-service")));
    section.close();
    return instrument;
  }

  /** A time longer than nothing. */
  static Duration duration(String text) {
    double seconds = Texts.of(Kind.DURATION).apply(text);
    if (!(seconds > 0)) {
      throw new BadQuantityException("'" + text + "' is no time at all");
    }
    return Duration.ofNanos(Math.round(seconds * 1e9));
  }

  /** Two points, shown = true, such as {@code "0.02 bar = 0 bar, 2.05 bar = 2 bar"}. */
  private static Calibration calibration(String text, Kind kind) {
    String[] ends = text.split("[=,]", -1);
    if (ends.length != 4 || text.indexOf(',') < text.indexOf('=')) {
      throw new BadQuantityException(
          "'" + text + "' is no calibration; write shown = true twice: '" + TWO_POINTS + "'");
    }
    double[] si = new double[ends.length];
    for (int i = 0; i < ends.length; i++) {
      si[i] =
          kind == Kind.PRESSURE ? Pressure.parse(ends[i]).pa() : Quantities.parse(ends[i], kind);
    }
    try {
      return new Calibration(si[0], si[1], si[2], si[3]);
    } catch (IllegalArgumentException unfit) {
      throw new BadQuantityException("'" + text + "': " + unfit.getMessage());
    }
  }

  private static OptionalDouble accuracy(Section section, Kind kind) {
    return switch (kind) {
      case PRESSURE -> section.quantity("accuracy", Texts::pressureDifferencePa);
      case TEMPERATURE -> section.quantity("accuracy", Texts.of(Kind.TEMPERATURE_DIFFERENCE));
      default -> section.quantity("accuracy", text -> Quantities.parse(text, kind));
    };
  }
}

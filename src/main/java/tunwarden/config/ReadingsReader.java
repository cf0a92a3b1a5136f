package tunwarden.config;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Quantity;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;

/** The {@code [vessel.….readings]} table: which instrument gives which quantity. */
final class ReadingsReader {
  private static final String EXAMPLE =
      "{ device = \"text-line\", port = \"/dev/ttyUSB0\", field = \"P\" }";

  private ReadingsReader() {}

  static List<Instrument> read(Section vessel, String id) {
    Section readings = vessel.section("readings");
    if (!vessel.has("readings")) {
      vessel.require("readings", "{ pressure = " + EXAMPLE + ", temperature = … }");
      return List.of();
    }
    List<Instrument> found = new ArrayList<>();
    for (Quantity quantity : Quantity.values()) {
      if (readings.has(quantity.word())) {
        found.add(instrument(readings.section(quantity.word()), id, quantity));
      }
    }
    readings.require(Quantity.PRESSURE.word(), EXAMPLE);
    readings.require(Quantity.TEMPERATURE.word(), EXAMPLE);
    readings.close();
    return found;
  }

  /** One instrument's table. */
  static Instrument instrument(Section section, String vessel, Quantity quantity) {
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
            accuracy(section, quantity.kind()));
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

  private static OptionalDouble accuracy(Section section, Kind kind) {
    return switch (kind) {
      case PRESSURE -> section.quantity("accuracy", Texts::pressureDifferencePa);
      case TEMPERATURE -> section.quantity("accuracy", Texts.of(Kind.TEMPERATURE_DIFFERENCE));
      default -> section.quantity("accuracy", text -> Quantities.parse(text, kind));
    };
  }
}

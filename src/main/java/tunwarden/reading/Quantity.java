package tunwarden.reading;

import java.util.Optional;
import tunwarden.units.Kind;

/** What an instrument, a log column or a person reports about a vessel. */
public enum Quantity {
  /** Headspace pressure in Pa gauge, against the local atmosphere. */
  PRESSURE("pressure", "pressure_bar_g", Kind.PRESSURE),
  /** Liquid temperature in K. */
  TEMPERATURE("temperature", "temperature_c", Kind.TEMPERATURE),
  /** Headspace temperature in K. */
  HEADSPACE_TEMPERATURE("headspace-temperature", "headspace_temperature_c", Kind.TEMPERATURE),
  /** Liquid volume in m³. */
  LEVEL("level", "level_l", Kind.VOLUME),
  /** Ambient pressure in Pa absolute. */
  BAROMETER("barometer", "barometer_bar_a", Kind.PRESSURE),
  /** Apparent extract in degrees Plato. */
  GRAVITY("gravity", "gravity_sg", Kind.EXTRACT),
  /** Dissolved CO2 by a laboratory, kg/m³. */
  DISSOLVED("dissolved", "dissolved_g_per_l", Kind.GAS_CONTENT);

  private final String word;
  private final String column;
  private final Kind kind;

  Quantity(String word, String column, Kind kind) {
    this.word = word;
    this.column = column;
    this.kind = kind;
  }

  /** Name in cellar files and on screens. */
  public String word() {
    return word;
  }

  /** Name of the log column, which also fixes the unit the log is written in. */
  public String column() {
    return column;
  }

  public Kind kind() {
    return kind;
  }

  /** The quantity with that cellar-file word, if there is one. */
  public static Optional<Quantity> ofWord(String word) {
    for (Quantity quantity : values()) {
      if (quantity.word.equals(word)) {
        return Optional.of(quantity);
      }
    }
    return Optional.empty();
  }
}

package tunwarden.wire.simulate;

import java.util.Map;
import tunwarden.wire.profile.Profile;

/**
 * An instrument played by the program, for rehearsals over a serial port: give it values, send what
 * it {@link #speak}s once a period, and pass it what comes in, sending back what it {@link #hear}s
 * fit to answer. Pure: owns no port and no clock.
 */
public interface PlayedInstrument {
  /**
   * Sets what it measures.
   *
   * @param values by field name, SI by the field's own reference (see {@code
   *     tunwarden.wire.measure.Samples#shown}); a field that is missing or NaN shows a fault
   */
  void show(Map<String, Double> values);

  /** What it sends unasked now; empty for an instrument that only answers. */
  byte[] speak();

  /** Takes bytes in; gives what it answers, empty while it has nothing to say. Never throws. */
  byte[] hear(byte[] bytes, int count);

  /**
   * An instrument of that profile.
   *
   * @param slave its address on the line; 0 for one without
   */
  static PlayedInstrument of(Profile profile, int slave) {
    return switch (profile.speaks()) {
      case TEXT_LINES, TEXT_QUERY -> new PlayedText(profile, slave);
      case MODBUS_RTU -> new PlayedRegisters(profile, slave);
    };
  }
}

package tunwarden.wire.profile;

import java.util.Map;
import java.util.Optional;

/**
 * A device profile: how one kind of instrument speaks. Reading one from a file is the work of the
 * configuration.
 *
 * @param name its name in a cellar file
 * @param title one line for people
 * @param speaks how it talks
 * @param line settings of the serial line
 * @param framing how a line of text is read; of no meaning for Modbus
 * @param polling how often and how patiently
 * @param fields its values by name, in file order
 */
public record Profile(
    String name,
    String title,
    Speaks speaks,
    LineSettings line,
    Framing framing,
    Polling polling,
    Map<String, Field> fields) {
  /** The field of that name, if there is one. */
  public Optional<Field> field(String field) {
    return Optional.ofNullable(fields.get(field));
  }
}

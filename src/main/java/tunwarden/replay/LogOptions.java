package tunwarden.replay;

import java.time.ZoneId;
import java.util.Optional;
import tunwarden.units.Constants;

/**
 * What a person says about a log beyond what stands in it.
 *
 * @param zone where times without an offset were written; UTC is taken otherwise, and said
 * @param columns which column is what, as {@code --columns} writes it; empty to look for them
 * @param vessel identity for rows that name no vessel
 * @param ambientPaAbsolute atmosphere taken off absolute pressures, Pa absolute, where the row has
 *     no barometer
 */
public record LogOptions(
    Optional<ZoneId> zone, String columns, String vessel, double ambientPaAbsolute) {
  /** Identity used when nobody names the vessel. */
  public static final String UNNAMED = "vessel";

  /** Nothing said. */
  public static final LogOptions NONE =
      new LogOptions(Optional.empty(), "", UNNAMED, Constants.STANDARD_ATMOSPHERE_PA);

  /** The same for rows of another vessel. */
  public LogOptions forVessel(String id) {
    return new LogOptions(zone, columns, id, ambientPaAbsolute);
  }

  /** The same with a zone for times without an offset. */
  public LogOptions inZone(ZoneId other) {
    return new LogOptions(Optional.of(other), columns, vessel, ambientPaAbsolute);
  }

  /** The same with the columns stated. */
  public LogOptions withColumns(String stated) {
    return new LogOptions(zone, stated, vessel, ambientPaAbsolute);
  }

  /** The same with another atmosphere. */
  public LogOptions withAmbient(double paAbsolute) {
    return new LogOptions(zone, columns, vessel, paAbsolute);
  }
}

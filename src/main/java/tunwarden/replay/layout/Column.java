package tunwarden.replay.layout;

import java.util.Optional;
import tunwarden.reading.Quantity;

/**
 * One column of a log that is used.
 *
 * @param index where it stands, counted from 0
 * @param name as the header writes it
 * @param role what it holds
 * @param quantity which quantity, for {@link Role#VALUE}
 * @param unit its unit, for {@link Role#VALUE} and {@link Role#UNCERTAINTY}
 * @param vessel the vessel it belongs to where one row speaks of several; empty otherwise
 */
public record Column(
    int index,
    String name,
    Role role,
    Optional<Quantity> quantity,
    Optional<CellUnit> unit,
    String vessel) {

  /** What a column holds. */
  public enum Role {
    /** Date and time of day, or an epoch count. */
    TIME,
    /** Time of day alone, beside a column with the date. */
    CLOCK,
    VESSEL,
    EVENT,
    VALUE,
    /** The 95 % uncertainty of the laboratory value in the same row. */
    UNCERTAINTY
  }

  /** A column without unit. */
  public static Column of(int index, String name, Role role) {
    return new Column(index, name, role, Optional.empty(), Optional.empty(), "");
  }

  /** A column of values. */
  public static Column value(int index, String name, Quantity quantity, CellUnit unit) {
    return new Column(index, name, Role.VALUE, Optional.of(quantity), Optional.of(unit), "");
  }

  /** The same column, belonging to one vessel. */
  public Column ofVessel(String other) {
    return new Column(index, name, role, quantity, unit, other);
  }

  /** Whether it holds that quantity. */
  public boolean holds(Quantity wanted) {
    return quantity.isPresent() && quantity.get() == wanted && role == Role.VALUE;
  }
}

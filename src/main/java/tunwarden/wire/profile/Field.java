package tunwarden.wire.profile;

import java.util.List;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.wire.signal.Conversion;

/**
 * One value an instrument reports.
 *
 * @param name as the cellar file calls it
 * @param kind what it measures
 * @param reference whether a pressure is counted from the atmosphere or from vacuum; of no meaning
 *     for other kinds
 * @param place where it stands
 * @param number how the number is read
 * @param conversion how the number becomes the quantity
 * @param trust what the instrument can do, and its accuracy
 */
public record Field(
    String name,
    Kind kind,
    Pressure.Reference reference,
    Place place,
    Number number,
    Conversion conversion,
    Trust trust) {
  /**
   * How the number is read: value = number × scale + offset.
   *
   * @param send what is sent to be told it, for a text query; empty otherwise
   * @param suffix what must stand behind the number, such as a unit; empty for nothing
   * @param scale factor
   * @param offset added after the factor
   * @param faultWords texts in place of a number that mean a fault
   * @param faultNumbers numbers, before scaling, that mean a fault
   */
  public record Number(
      String send,
      String suffix,
      double scale,
      double offset,
      List<String> faultWords,
      List<Double> faultNumbers) {
    /** A plain number. */
    public static final Number PLAIN = new Number("", "", 1, 0, List.of(), List.of());
  }

  /**
   * What the instrument can do.
   *
   * @param lowSi lowest value it can measure, SI, by the field's own reference
   * @param highSi highest value it can measure
   * @param u95Si accuracy as a 95 % expanded uncertainty, SI difference
   * @param responseS time constant, s; 0 when not stated
   */
  public record Trust(double lowSi, double highSi, double u95Si, double responseS) {}
}

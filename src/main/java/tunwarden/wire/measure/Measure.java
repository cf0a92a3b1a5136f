package tunwarden.wire.measure;

import java.util.Locale;
import tunwarden.reading.Quality;
import tunwarden.units.Pressure;
import tunwarden.units.Unit;
import tunwarden.wire.profile.Field;
import tunwarden.wire.signal.Decoded;

/** Judges a raw number by what its field allows. Never throws. */
public final class Measure {
  private Measure() {}

  /** The value in SI by the field's own reference, or why it is not to be believed. */
  public static Decoded judge(double raw, Field field) {
    Field.Number number = field.number();
    if (!Double.isFinite(raw)) {
      return Decoded.bad(Quality.NOT_FINITE, String.valueOf(raw));
    }
    if (number.faultNumbers().contains(raw)) {
      String said = String.format(Locale.ROOT, "the instrument sends its fault number %.7g", raw);
      return Decoded.bad(Quality.LOOP_FAULT, said);
    }
    Decoded value = field.conversion().toSi(raw * number.scale() + number.offset());
    Field.Trust trust = field.trust();
    if (value.isBad() || (value.si() >= trust.lowSi() && value.si() <= trust.highSi())) {
      return value;
    }
    String seen =
        String.format(
            Locale.ROOT,
            "%s, the range is %s to %s",
            words(value.si(), field),
            words(trust.lowSi(), field),
            words(trust.highSi(), field));
    return Decoded.bad(Quality.OUT_OF_RANGE, seen);
  }

  /** The raw number an instrument would send for a value by the field's own reference. */
  public static double raw(double si, Field field) {
    Field.Number number = field.number();
    return (field.conversion().fromSi(si) - number.offset()) / number.scale();
  }

  /** A value for a person: in bar, °C or another everyday unit of its kind. */
  public static String words(double si, Field field) {
    return switch (field.kind()) {
      case PRESSURE -> format(Unit.BAR.fromSi(si), "%.4f bar ") + reference(field);
      case TEMPERATURE -> format(Unit.CELSIUS.fromSi(si), "%.2f °C");
      case VOLUME -> format(Unit.LITRE.fromSi(si), "%.1f L");
      case EXTRACT -> format(si, "%.2f °P");
      case GAS_CONTENT -> format(si, "%.3f g/L");
      default -> format(si, "%.6g");
    };
  }

  private static String reference(Field field) {
    return field.reference() == Pressure.Reference.GAUGE ? "gauge" : "absolute";
  }

  private static String format(double value, String pattern) {
    return String.format(Locale.ROOT, pattern, value);
  }
}

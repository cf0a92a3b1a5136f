package tunwarden.report.otherwise;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.units.BadInputException;
import tunwarden.units.Pressure;

/**
 * What is to be changed.
 *
 * @param words as the user wrote it
 * @param reliefPaGauge another relief setting, Pa gauge
 * @param vent a vent that did not happen
 */
public record WhatIf(String words, OptionalDouble reliefPaGauge, Optional<Vent> vent) {
  private static final String OPTION = "--what-if: ";

  /**
   * A vent.
   *
   * @param when a time of day in the log's zone, or a full time with its offset
   * @param toPaGauge pressure at which it is shut again, Pa gauge
   */
  public record Vent(String when, double toPaGauge) {
    /** The moment it means: the first such time of day after the log's beginning. */
    public Instant after(Instant start, ZoneId zone) {
      if (when.indexOf('T') > 0) {
        return OffsetDateTime.parse(when).toInstant();
      }
      ZonedDateTime first = start.atZone(zone);
      ZonedDateTime same = first.with(LocalTime.parse(when));
      return (same.isBefore(first) ? same.plusDays(1) : same).toInstant();
    }
  }

  /**
   * Reads {@code relief=1.2bar,vent=08:30@0.3bar}.
   *
   * @throws BadInputException when the text says nothing of the kind
   */
  public static WhatIf parse(String text, double ambientPaAbsolute) {
    OptionalDouble relief = OptionalDouble.empty();
    Optional<Vent> vent = Optional.empty();
    for (String item : text.split(",")) {
      int equals = item.indexOf('=');
      String key = equals < 0 ? item : item.substring(0, equals).trim();
      String value = item.substring(equals + 1).trim();
      switch (key) {
        case "relief" -> relief = OptionalDouble.of(gauge(value, ambientPaAbsolute));
        case "vent" -> vent = Optional.of(vent(value, ambientPaAbsolute));
        default ->
            throw new BadInputException(
                OPTION + "'" + item + "' is neither relief=PRESSURE nor vent=TIME@PRESSURE");
      }
    }
    return new WhatIf(text, relief, vent);
  }

  private static double gauge(String text, double ambientPaAbsolute) {
    return Pressure.parse(text).gaugePa(ambientPaAbsolute);
  }

  private static Vent vent(String text, double ambientPaAbsolute) {
    int at = text.lastIndexOf('@');
    if (at < 1) {
      throw new BadInputException(OPTION + "'" + text + "' is not of the form 08:30@0.3bar");
    }
    String when = text.substring(0, at);
    try {
      if (when.indexOf('T') > 0) {
        OffsetDateTime.parse(when);
      } else {
        LocalTime.parse(when);
      }
    } catch (DateTimeException noTime) {
      throw new BadInputException(
          OPTION + "'" + when + "' is not a time; write 08:30 or 2026-03-02T08:30:00Z", noTime);
    }
    return new Vent(when, gauge(text.substring(at + 1), ambientPaAbsolute));
  }
}

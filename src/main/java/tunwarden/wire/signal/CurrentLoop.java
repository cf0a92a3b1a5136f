package tunwarden.wire.signal;

import java.util.Locale;
import tunwarden.reading.Quality;

/**
 * A 4–20 mA loop read through an input module, with the limits of NAMUR NE 43: 3.8 to 20.5 mA is a
 * measurement, at most 3.6 or at least 21 mA is a failure signal, and the gaps between are neither,
 * so they count as failure too.
 *
 * @param at4Si the quantity at 4 mA, SI
 * @param at20Si the quantity at 20 mA, SI
 */
public record CurrentLoop(double at4Si, double at20Si) implements Conversion {
  /** NE 43: lowest current that is still a measurement, mA. */
  public static final double LEAST_MA = 3.8;

  /** NE 43: highest current that is still a measurement, mA. */
  public static final double MOST_MA = 20.5;

  private static final double ZERO_MA = 4;
  private static final double SPAN_MA = 16;

  @Override
  public Decoded toSi(double milliampere) {
    if (milliampere >= LEAST_MA && milliampere <= MOST_MA) {
      return Decoded.good(at4Si + (milliampere - ZERO_MA) / SPAN_MA * (at20Si - at4Si));
    }
    return Decoded.bad(
        Quality.LOOP_FAULT, String.format(Locale.ROOT, "%.2f mA in the loop", milliampere));
  }

  @Override
  public double fromSi(double si) {
    return ZERO_MA + SPAN_MA * (si - at4Si) / (at20Si - at4Si);
  }
}

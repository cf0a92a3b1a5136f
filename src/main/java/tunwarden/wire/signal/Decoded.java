package tunwarden.wire.signal;

import tunwarden.reading.Quality;

/**
 * What became of one number on the wire.
 *
 * @param si the value in SI; NaN, and not to be used, when the quality is bad
 * @param quality how far it is to be believed
 * @param detail what was seen, for a person; empty when all is well
 */
public record Decoded(double si, Quality quality, String detail) {
  /** A value to be believed; one that is not finite becomes a bad one. */
  public static Decoded good(double si) {
    return Double.isFinite(si)
        ? new Decoded(si, Quality.GOOD, "")
        : bad(Quality.NOT_FINITE, String.valueOf(si));
  }

  /** No value, and why. */
  public static Decoded bad(Quality quality, String detail) {
    return new Decoded(Double.NaN, quality, detail);
  }

  public boolean isBad() {
    return quality.isBad();
  }
}

package tunwarden.wire.modbus;

import java.util.Locale;
import java.util.Map;
import tunwarden.reading.Quality;
import tunwarden.wire.ask.Result;

/** The exception codes of the Modbus Application Protocol, in words. */
final class Refusals {
  /** The code for a register that is not there. */
  static final int NO_SUCH_ADDRESS = 2;

  private static final Map<Integer, String> WORDS =
      Map.of(
          1,
          "illegal function",
          NO_SUCH_ADDRESS,
          "illegal data address",
          3,
          "illegal data value",
          4,
          "server device failure",
          5,
          "acknowledge, still working",
          6,
          "server device busy",
          8,
          "memory parity error",
          10,
          "gateway path unavailable",
          11,
          "gateway target failed to respond");

  private Refusals() {}

  static Result.Refusal of(int code, int unit) {
    String words =
        WORDS.getOrDefault(code, String.format(Locale.ROOT, "unknown exception %02X", code));
    return new Result.Refusal(code, quality(code), "unit " + unit + ": " + words);
  }

  private static Quality quality(int code) {
    return switch (code) {
      case 4, 8 -> Quality.OUT_OF_SERVICE;
      case 5, 6, 10, 11 -> Quality.NO_ANSWER;
      default -> Quality.UNREADABLE;
    };
  }
}

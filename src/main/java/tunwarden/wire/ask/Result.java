package tunwarden.wire.ask;

import java.util.Map;
import tunwarden.reading.Quality;
import tunwarden.wire.signal.Decoded;

/** What came of a question. */
public sealed interface Result {
  /** The values asked for, by field name. */
  record Values(Map<String, Decoded> values) implements Result {}

  /** The bare data of a block of registers, for a look at an unknown instrument. */
  record Block(byte[] data) implements Result {}

  /**
   * The instrument answered that it will not, or cannot.
   *
   * @param code its reason as a number
   * @param quality what that means for the reading
   * @param words its reason in words
   */
  record Refusal(int code, Quality quality, String words) implements Result {}

  /**
   * No answer that could be used.
   *
   * @param quality no answer, failed checksum or unreadable
   * @param detail what came instead, for a person
   */
  record Failure(Quality quality, String detail) implements Result {}
}

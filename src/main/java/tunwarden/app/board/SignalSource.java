package tunwarden.app.board;

import java.util.function.Supplier;

/**
 * Where the readings of one quantity of one vessel come from.
 *
 * @param device name of the device profile, or what stands in its place
 * @param port port or file
 * @param words what a person should know of the line at this moment; may give an empty text
 */
public record SignalSource(String device, String port, Supplier<String> words) {
  /** A value typed in by a person. */
  public static final SignalSource BY_HAND = new SignalSource("typed in", "", () -> "");
}

package tunwarden.replay.layout;

import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Settles how a log is read: our own format by its names, anything else by looking, aloud. */
public final class LayoutFinder {
  private LayoutFinder() {}

  /**
   * The layout of a log.
   *
   * @param head its first lines
   * @param stated which column is what, as {@code --columns} writes it; empty to look
   * @param zone where times without an offset were written, if stated
   * @param earlier what was already guessed about the file; empty for nothing
   * @throws LayoutException when it cannot be settled
   */
  public static Layout find(
      List<SampledLine> head, String stated, Optional<ZoneId> zone, String earlier)
      throws LayoutException {
    List<ColumnChoice> choices = ColumnChoice.parse(stated);
    if (choices.isEmpty()) {
      Optional<Layout> own = ownFormat(head);
      if (own.isPresent()) {
        return own.get();
      }
    }
    boolean counts =
        choices.stream()
            .anyMatch(c -> c.word().equals("time") && TimeForm.COUNTS.contains(c.tail()));
    Table table = Table.find(head, counts);
    List<String> guesses = new ArrayList<>();
    if (!earlier.isEmpty()) {
      guesses.add(earlier);
    }
    return new LayoutGuess(table, choices, zone, guesses).layout();
  }

  private static Optional<Layout> ownFormat(List<SampledLine> head) {
    for (SampledLine line : head) {
      if (!line.isBlank() && !line.isComment()) {
        return NativeLayout.of(line);
      }
    }
    return Optional.empty();
  }
}

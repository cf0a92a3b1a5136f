package tunwarden.screen.model;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import tunwarden.assess.Margins;
import tunwarden.vessel.Vessel;

/**
 * Which vessels are listed, and in what order.
 *
 * @param filter part of an identity or title; empty lists all
 * @param sort the order
 */
public record Listing(String filter, Sort sort) {
  /** All vessels, least margin first. */
  public static final Listing ALL = new Listing("", Sort.MARGIN);

  /** Orders of the cellar page. */
  public enum Sort {
    MARGIN("least margin first"),
    NAME("by name"),
    PRESSURE("highest pressure first"),
    FILE("as in the cellar file");

    private final String words;

    Sort(String words) {
      this.words = words;
    }

    public String words() {
      return words;
    }
  }

  /** The same vessels in the next order. */
  public Listing nextSort() {
    return new Listing(filter, Sort.values()[(sort.ordinal() + 1) % Sort.values().length]);
  }

  public Listing withFilter(String text) {
    return new Listing(text, sort);
  }

  /** The vessels of the board that match, in order. */
  public List<VesselBoard> of(Board board) {
    Stream<VesselBoard> matching = board.vessels().stream().filter(this::matches);
    return switch (sort) {
      case MARGIN -> matching.sorted(Comparator.comparingDouble(Listing::urgency)).toList();
      case NAME -> matching.sorted(Comparator.comparing(VesselBoard::id)).toList();
      case PRESSURE ->
          matching.sorted(Comparator.comparingDouble(v -> -pressurePaGauge(v))).toList();
      case FILE -> matching.toList();
    };
  }

  private boolean matches(VesselBoard board) {
    Vessel vessel = board.assessment().vessel();
    String wanted = filter.toLowerCase(Locale.ROOT);
    return vessel.id().toLowerCase(Locale.ROOT).contains(wanted)
        || vessel.title().toLowerCase(Locale.ROOT).contains(wanted);
  }

  /** Least first. A vessel whose margin cannot be told comes before all that have one. */
  private static double urgency(VesselBoard board) {
    boolean relief = board.assessment().vessel().limits().relief().isPresent();
    if (!relief) {
      return Double.POSITIVE_INFINITY;
    }
    double margin = board.assessment().margins().map(Margins::reliefPa).orElse(Double.NaN);
    return Double.isFinite(margin) ? margin : Double.NEGATIVE_INFINITY;
  }

  private static double pressurePaGauge(VesselBoard board) {
    return board.assessment().pressure().value().orElse(Double.NEGATIVE_INFINITY);
  }
}

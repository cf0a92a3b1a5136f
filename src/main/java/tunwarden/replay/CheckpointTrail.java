package tunwarden.replay;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;

/**
 * Places to return to, ever further apart as the log gets longer, so that their number stays
 * bounded and a seek backwards re-reads only a small part.
 */
final class CheckpointTrail {
  private static final int MOST = 128;

  /**
   * One place.
   *
   * @param rows rows fed before it
   * @param at data time of the newest of those rows
   * @param state the target's own memory
   */
  record Place(long rows, Instant at, Object state) {}

  private final List<Place> places = new ArrayList<>();
  private long spacing = 256;

  /** Whether a place is wanted after this many rows. */
  boolean wants(long rows) {
    return places.isEmpty() || rows >= places.get(places.size() - 1).rows() + spacing;
  }

  void add(Place place) {
    places.add(place);
    if (places.size() > MOST) {
      for (int i = places.size() - 2; i > 0; i -= 2) {
        places.remove(i);
      }
      spacing *= 2;
    }
  }

  /** The newest place not after {@code time}; the first one when all are later. */
  Place before(Instant time) {
    Place best = places.get(0);
    for (Place place : places) {
      if (place.rows() > 0 && place.at().isAfter(time)) {
        break;
      }
      best = place;
    }
    return best;
  }

  int size() {
    return places.size();
  }
}

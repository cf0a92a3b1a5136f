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
  private static final int LEAST = 16;

  /** Vessels whose places take little room. */
  private static final int FEW_VESSELS = 4;

  private final int most;

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

  /** A trail that keeps fewer places the more vessels each of them holds. */
  CheckpointTrail(int vessels) {
    most = Math.max(LEAST, MOST / Math.max(1, vessels / FEW_VESSELS));
  }

  /** Whether a place is wanted after this many rows. */
  boolean wants(long rows) {
    return places.isEmpty() || rows >= places.get(places.size() - 1).rows() + spacing;
  }

  void add(Place place) {
    places.add(place);
    if (places.size() > most) {
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

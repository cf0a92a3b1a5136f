package tunwarden.wire.modbus;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Place;

/**
 * Puts the fields of one instrument into as few requests as can be. RTU has no mark that ties an
 * answer to its request, so a very late answer can only be told by its length: blocks of one
 * instrument are therefore read as one where possible, else with different register counts.
 */
public enum Blocks {
  /** Small gaps between fields are read along. */
  JOINED(16, true),
  /** No gap is read; where two blocks would be of one length, one register more is read. */
  DISTINCT(0, true),
  /** Nothing but the fields is read, for instruments that refuse anything else. */
  BARE(0, false);

  private static final int MOST = 120;

  private final int gap;
  private final boolean distinct;

  Blocks(int gap, boolean distinct) {
    this.gap = gap;
    this.distinct = distinct;
  }

  /** The next, more modest way, for when an instrument says that an address is not there. */
  public Blocks afterRefusal() {
    return this == JOINED ? DISTINCT : BARE;
  }

  /** The questions that together read the fields, all of one instrument. */
  public List<RtuQuestion> questions(int unit, List<Field> fields) {
    List<Field> sorted = new ArrayList<>(new HashSet<>(fields));
    sorted.sort(
        Comparator.comparingInt((Field f) -> place(f).function())
            .thenComparingInt(f -> place(f).address()));
    List<RtuQuestion> questions = new ArrayList<>();
    Set<Integer> lengths = new HashSet<>();
    int i = 0;
    while (i < sorted.size()) {
      int first = place(sorted.get(i)).address();
      int end = end(sorted.get(i));
      int j = i + 1;
      while (j < sorted.size() && belongs(sorted, i, j, end)) {
        end = Math.max(end, end(sorted.get(j)));
        j++;
      }
      int function = place(sorted.get(i)).function();
      RtuRequest request = request(unit, function, first, end - first, lengths);
      questions.add(new RtuQuestion(request, List.copyOf(sorted.subList(i, j))));
      i = j;
    }
    return questions;
  }

  private boolean belongs(List<Field> sorted, int from, int next, int end) {
    Place.Register start = place(sorted.get(from));
    Place.Register candidate = place(sorted.get(next));
    return candidate.function() == start.function()
        && candidate.address() <= end + gap
        && end(sorted.get(next)) - start.address() <= MOST;
  }

  private RtuRequest request(int unit, int function, int first, int count, Set<Integer> lengths) {
    RtuRequest request = new RtuRequest(unit, function, first, count);
    while (distinct && !lengths.add(function << 16 | request.dataBytes())) {
      boolean room = request.address() + request.count() < 0x10000;
      request =
          new RtuRequest(
              unit,
              function,
              room ? request.address() : request.address() - 1,
              request.count() + 1);
    }
    return request;
  }

  private static Place.Register place(Field field) {
    return (Place.Register) field.place();
  }

  private static int end(Field field) {
    Place.Register register = place(field);
    return register.address() + register.type().registers();
  }
}

package tunwarden.assess;

import java.util.Arrays;

/**
 * The newest bins of one width. A bin is found by its number, the seconds since 1970 over the
 * width; its place in the ring is that number modulo the ring's size. Arrays grow as they fill.
 */
final class HistoryRing {
  private static final long NONE = Long.MIN_VALUE;
  private static final int FIRST_SIZE = 64;

  private final long binS;
  private final int capacity;
  private long[] number = new long[0];
  private float[] min = new float[0];
  private float[] max = new float[0];
  private float[] last = new float[0];
  private long newest = NONE;
  private long oldest = NONE;

  HistoryRing(long binS, int capacity) {
    this.binS = binS;
    this.capacity = capacity;
  }

  long binS() {
    return binS;
  }

  void clear() {
    newest = NONE;
    oldest = NONE;
    Arrays.fill(number, NONE);
  }

  /** Forgets every bin that begins after that time. */
  void forgetAfter(long second) {
    long kept = Math.floorDiv(second, binS);
    if (newest == NONE || newest <= kept) {
      return;
    }
    if (oldest > kept) {
      clear();
      return;
    }
    for (int i = 0; i < number.length; i++) {
      if (number[i] > kept) {
        number[i] = NONE;
      }
    }
    newest = kept;
  }

  void put(long second, float value) {
    long bin = Math.floorDiv(second, binS);
    if (newest != NONE && bin <= newest - capacity) {
      return;
    }
    makeRoom(bin);
    int at = Math.floorMod(bin, number.length);
    if (number[at] == bin) {
      min[at] = Math.min(min[at], value);
      max[at] = Math.max(max[at], value);
    } else {
      number[at] = bin;
      min[at] = value;
      max[at] = value;
    }
    last[at] = value;
    newest = newest == NONE ? bin : Math.max(newest, bin);
    oldest = oldest == NONE ? bin : Math.min(oldest, bin);
  }

  /** Doubles the arrays until every bin from the oldest to this one has a place of its own. */
  private void makeRoom(long bin) {
    long span = newest == NONE ? 1 : Math.max(newest, bin) - Math.min(oldest, bin) + 1;
    int wanted = Math.max(number.length, FIRST_SIZE);
    while (wanted < span && wanted < capacity) {
      wanted = Math.min(2 * wanted, capacity);
    }
    if (wanted == number.length) {
      return;
    }
    long[] oldNumber = number;
    float[][] old = {min, max, last};
    number = new long[wanted];
    Arrays.fill(number, NONE);
    min = new float[wanted];
    max = new float[wanted];
    last = new float[wanted];
    for (int i = 0; i < oldNumber.length; i++) {
      if (oldNumber[i] != NONE) {
        int at = Math.floorMod(oldNumber[i], wanted);
        number[at] = oldNumber[i];
        min[at] = old[0][i];
        max[at] = old[1][i];
        last[at] = old[2][i];
      }
    }
  }

  /** Whether no bin since that time has been pushed out. */
  boolean reachesBackTo(double second) {
    return newest == NONE
        || newest - oldest < capacity
        || second >= (newest - capacity + 1L) * (double) binS;
  }

  /** Merges the bins into the columns they touch. */
  void read(double fromS, double columnS, History.Trace into) {
    if (newest == NONE) {
      return;
    }
    double toS = fromS + columnS * into.columns();
    long first = Math.max((long) Math.floor(fromS / binS), newest - capacity + 1);
    first = Math.max(first, oldest);
    long end = Math.min((long) Math.ceil(toS / binS) - 1, newest);
    for (long bin = first; bin <= end; bin++) {
      int at = Math.floorMod(bin, number.length);
      if (number[at] == bin) {
        merge(at, bin * (double) binS - fromS, columnS, into);
      }
    }
  }

  private void merge(int at, double offsetS, double columnS, History.Trace into) {
    int from = Math.max(0, (int) Math.floor(offsetS / columnS));
    int to = (int) Math.ceil((offsetS + binS) / columnS) - 1;
    for (int column = from; column <= Math.min(to, into.columns() - 1); column++) {
      boolean fresh = !into.has(column);
      into.min()[column] = fresh ? min[at] : Math.min(into.min()[column], min[at]);
      into.max()[column] = fresh ? max[at] : Math.max(into.max()[column], max[at]);
      into.last()[column] = last[at];
    }
  }
}

package tunwarden.station;

import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.Transition;
import tunwarden.assess.Assessment;

/**
 * Keeps the alarm book of a station: folds every assessment into it and hands on what changed.
 * Written on the station's thread only; the book itself is immutable and may be read anywhere.
 */
public final class AlarmKeeper implements Sink {
  private final List<Listener> listeners;
  private volatile AlarmBook book;

  /** Hears of what changed, on the station's thread. */
  @FunctionalInterface
  public interface Listener {
    /** The transitions of one step, at least one, and the book after them. */
    void changed(AlarmBook.Folded folded);

    /** One that looks at each transition by itself. */
    static Listener each(Consumer<Transition> taker) {
      return folded -> folded.transitions().forEach(taker);
    }
  }

  /**
   * Starts from a book, empty or restored.
   *
   * @param listeners told in this order
   */
  public AlarmKeeper(AlarmBook book, List<Listener> listeners) {
    this.book = book;
    this.listeners = List.copyOf(listeners);
  }

  @Override
  public void assessed(Assessment assessment) {
    change(current -> current.fold(assessment));
  }

  /**
   * Applies what a person or the station itself does to the alarms; on the station's thread.
   *
   * @return what came of it; no transitions when there was nothing to do
   */
  public synchronized AlarmBook.Folded change(Function<AlarmBook, AlarmBook.Folded> deed) {
    AlarmBook.Folded folded = deed.apply(book);
    book = folded.book();
    if (!folded.transitions().isEmpty()) {
      listeners.forEach(listener -> listener.changed(folded));
    }
    return folded;
  }

  /** Goes back to a book kept earlier, as a replay does. */
  public synchronized void restore(AlarmBook kept) {
    book = kept;
  }

  /** The present book; safe from any thread. */
  public AlarmBook book() {
    return book;
  }
}

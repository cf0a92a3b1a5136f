package tunwarden.alarm;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import tunwarden.assess.Assessment;

/**
 * All alarms of a station. Immutable: every step returns the next book and the transitions that led
 * to it, so the same assessments give the same alarms, live or replayed. The station's own alarms
 * stand under the empty vessel name.
 */
public final class AlarmBook {
  /** The station's own page. */
  public static final String STATION = "";

  private static final Comparator<Alarm> WORST_FIRST =
      Comparator.comparing((Alarm alarm) -> !alarm.state().wantsAcknowledging())
          .thenComparing(Alarm::priority, Comparator.reverseOrder())
          .thenComparing(Alarm::since, Comparator.reverseOrder())
          .thenComparing(Alarm::vessel)
          .thenComparing(Alarm::kind);

  private final AlarmSettings settings;
  private final Map<String, Page> pages;
  private final AlarmCounts counts;

  /**
   * A step of the fold.
   *
   * @param book the next book
   * @param transitions what changed, in order
   */
  public record Folded(AlarmBook book, List<Transition> transitions) {}

  private AlarmBook(AlarmSettings settings, Map<String, Page> pages, AlarmCounts counts) {
    this.settings = settings;
    this.pages = pages;
    this.counts = counts;
  }

  /** A book with nothing in it. */
  public static AlarmBook empty(AlarmSettings settings) {
    return new AlarmBook(settings, Map.of(), AlarmCounts.ZERO);
  }

  /** A book as it was saved. */
  public static AlarmBook restored(
      AlarmSettings settings, List<AlarmMemory> memories, AlarmCounts counts) {
    Map<String, Page> pages = new TreeMap<>();
    for (AlarmMemory memory : memories) {
      pages.merge(memory.vessel(), Page.of(memory), (page, one) -> page.with(memory));
    }
    return new AlarmBook(settings, pages, counts);
  }

  public AlarmSettings settings() {
    return settings;
  }

  public AlarmCounts counts() {
    return counts;
  }

  /** The same alarms under other settings. */
  public AlarmBook withSettings(AlarmSettings other) {
    return new AlarmBook(other, pages, counts);
  }

  /** Every alarm that is not normal; what wants acknowledging first, then the worst, the newest. */
  public List<Alarm> alarms() {
    return pages.values().stream().flatMap(Page::alarms).sorted(WORST_FIRST).toList();
  }

  /** The alarms of one vessel, in the same order. */
  public List<Alarm> alarms(String vessel) {
    return page(vessel).alarms().sorted(WORST_FIRST).toList();
  }

  /** All that must be saved, in a fixed order. */
  public List<AlarmMemory> memories() {
    return pages.values().stream().flatMap(page -> page.memories().stream()).toList();
  }

  /** Takes in an assessment. */
  public Folded fold(Assessment assessment) {
    String vessel = assessment.vessel().id();
    Instant at = assessment.time();
    Page page = page(vessel);
    List<Transition> out = new ArrayList<>();
    Page next = page;
    for (Condition condition : Conditions.of(assessment, settings, page)) {
      next = next.take(settings.heeded(condition), vessel, settings, at, out);
    }
    return folded(vessel, next, out, at);
  }

  /**
   * Takes in what is known about the station itself (disk, clock, cellar file, notices).
   *
   * @param text one sentence with its numbers
   */
  public Folded report(AlarmKind kind, boolean active, String text, Instant at) {
    List<Transition> out = new ArrayList<>();
    Condition.Truth truth = active ? Condition.Truth.YES : Condition.Truth.NO;
    Condition condition = Condition.plain(kind, truth, active ? text : "");
    Page next = page(STATION).take(settings.heeded(condition), STATION, settings, at, out);
    return folded(STATION, next, out, at);
  }

  /** Lets time pass for the station's own page: shelves end by themselves. */
  public Folded tick(Instant at) {
    List<Transition> out = new ArrayList<>();
    return folded(STATION, page(STATION).expireShelves(at, out), out, at);
  }

  /**
   * A person has seen an alarm.
   *
   * @param word what they say about it; may be empty
   * @return an unchanged book and no transition when there was nothing to acknowledge
   */
  public Folded acknowledge(AlarmKind kind, String vessel, String word, Instant at) {
    return change(kind, vessel, at, (memory, out) -> memory.acknowledge(word, at, out));
  }

  /**
   * Puts an alarm away for a while.
   *
   * @throws IllegalArgumentException with one plain sentence when the reason is empty, or the end
   *     is not after now or further away than the settings allow
   */
  public Folded shelve(AlarmKind kind, String vessel, String reason, Instant until, Instant at) {
    requireReason(reason);
    Duration length = Duration.between(at, until);
    if (length.isNegative() || length.isZero() || length.compareTo(settings.longestShelf()) > 0) {
      throw new IllegalArgumentException(
          "an alarm is shelved for more than nothing and at most "
              + Words.duration(settings.longestShelf()));
    }
    Handling.Shelf shelf = new Handling.Shelf(until, reason);
    return change(kind, vessel, at, (memory, out) -> memory.shelve(shelf, at, out));
  }

  /** Takes an alarm off the shelf before its time. */
  public Folded unshelve(AlarmKind kind, String vessel, Instant at) {
    return change(kind, vessel, at, (memory, out) -> memory.unshelve(at, out));
  }

  /**
   * Takes an alarm out of service until a person puts it back.
   *
   * @throws IllegalArgumentException when the reason is empty
   */
  public Folded outOfService(AlarmKind kind, String vessel, String reason, Instant at) {
    requireReason(reason);
    return change(kind, vessel, at, (memory, out) -> memory.takeOutOfService(reason, at, out));
  }

  /** Puts an alarm back in service; if its condition holds it is raised afresh. */
  public Folded inService(AlarmKind kind, String vessel, Instant at) {
    return change(kind, vessel, at, (memory, out) -> memory.putBackInService(at, out));
  }

  /**
   * The estimator of a vessel started afresh and will never report the end of what it had begun:
   * alarms told by events return to normal.
   */
  public Folded eventsLost(String vessel, Instant at) {
    List<Transition> out = new ArrayList<>();
    Page next = page(vessel);
    for (AlarmKind kind : AlarmKind.values()) {
      if (kind.isEvent()) {
        next = next.take(Condition.no(kind), vessel, settings, at, out);
      }
    }
    return folded(vessel, next, out, at);
  }

  /** Forgets vessels that are no longer described; nothing watches them any more. */
  public AlarmBook retain(Set<String> vessels) {
    Map<String, Page> kept = new TreeMap<>(pages);
    kept.keySet().removeIf(vessel -> !vessel.equals(STATION) && !vessels.contains(vessel));
    return new AlarmBook(settings, kept, counts);
  }

  private interface Deed {
    AlarmMemory on(AlarmMemory memory, List<Transition> out);
  }

  private Folded change(AlarmKind kind, String vessel, Instant at, Deed deed) {
    List<Transition> out = new ArrayList<>();
    Page page = page(vessel);
    AlarmMemory before = page.memory(kind).orElseGet(() -> AlarmMemory.fresh(kind, vessel, at));
    return folded(vessel, page.with(deed.on(before, out)), out, at);
  }

  private Folded folded(String vessel, Page next, List<Transition> out, Instant at) {
    int raised = 0;
    int chatter = 0;
    for (Transition transition : out) {
      boolean told = transition.annunciates();
      raised += told ? 1 : 0;
      chatter += told && transition.alarm().chattering() ? 1 : 0;
    }
    AlarmCounts counted = counts.count(raised, chatter, at);
    if (next == page(vessel) && counted == counts) {
      return new Folded(this, List.of());
    }
    Map<String, Page> changed = new TreeMap<>(pages);
    changed.put(vessel, next);
    return new Folded(new AlarmBook(settings, changed, counted), List.copyOf(out));
  }

  private Page page(String vessel) {
    return pages.getOrDefault(vessel, Page.EMPTY);
  }

  private static void requireReason(String reason) {
    if (reason.isBlank()) {
      throw new IllegalArgumentException("say in a few words why, so that the next person knows");
    }
  }
}

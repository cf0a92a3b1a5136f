package tunwarden.alarm;

import java.time.Instant;
import java.util.Collection;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/** The alarms of one vessel that are worth remembering. Never changed once it is out of here. */
final class Page {
  static final Page EMPTY = new Page(new EnumMap<>(AlarmKind.class));

  private final Map<AlarmKind, AlarmMemory> memories;

  private Page(Map<AlarmKind, AlarmMemory> memories) {
    this.memories = memories;
  }

  static Page of(AlarmMemory memory) {
    return EMPTY.with(memory);
  }

  /** The same page with one memory put in, or left out if there is nothing to remember. */
  Page with(AlarmMemory memory) {
    AlarmMemory present = memories.get(memory.kind());
    if (memory.equals(present) || (present == null && memory.isIdle())) {
      return this;
    }
    Map<AlarmKind, AlarmMemory> next = new EnumMap<>(memories);
    if (memory.isIdle()) {
      next.remove(memory.kind());
    } else {
      next.put(memory.kind(), memory);
    }
    return new Page(next);
  }

  Page take(
      Condition condition,
      String vessel,
      AlarmSettings settings,
      Instant at,
      List<Transition> out) {
    AlarmMemory before = memories.get(condition.kind());
    if (before == null) {
      if (condition.truth() != Condition.Truth.YES && condition.truth() != Condition.Truth.OVER) {
        return this;
      }
      before = AlarmMemory.fresh(condition.kind(), vessel, at);
    }
    return with(before.take(condition, settings, at, out));
  }

  Page expireShelves(Instant at, List<Transition> out) {
    Page next = this;
    for (AlarmMemory memory : memories.values()) {
      next = next.with(memory.expireShelf(at, out));
    }
    return next;
  }

  /** Whether the condition of that kind holds at present: decides about deadbands. */
  boolean isActive(AlarmKind kind) {
    AlarmMemory memory = memories.get(kind);
    return memory != null && memory.signal().active();
  }

  Optional<AlarmMemory> memory(AlarmKind kind) {
    return Optional.ofNullable(memories.get(kind));
  }

  Collection<AlarmMemory> memories() {
    return memories.values();
  }

  Stream<Alarm> alarms() {
    return memories.values().stream()
        .filter(memory -> memory.state() != AlarmState.NORMAL)
        .map(AlarmMemory::alarm);
  }
}

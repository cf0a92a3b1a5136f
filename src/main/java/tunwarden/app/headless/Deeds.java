package tunwarden.app.headless;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Consumer;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.Transition;
import tunwarden.config.Cellar;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.request.Reply;
import tunwarden.journal.request.Request;
import tunwarden.reading.Mark;
import tunwarden.reading.Sample;
import tunwarden.station.AlarmKeeper;

/** Carries out what people ask of a running program; on the station's thread. */
final class Deeds {
  private final AlarmKeeper alarms;
  private final Consumer<Sample> station;
  private final Consumer<JournalEntry> journal;

  /**
   * Deeds on a station.
   *
   * @param station takes notes on a vessel
   * @param journal takes notes on the station itself
   */
  Deeds(AlarmKeeper alarms, Consumer<Sample> station, Consumer<JournalEntry> journal) {
    this.alarms = alarms;
    this.station = station;
    this.journal = journal;
  }

  Reply carryOut(Request request, Cellar cellar, Instant now) {
    if (!request.vessel().isEmpty() && cellar.vessel(request.vessel()).isEmpty()) {
      String known = String.join(", ", cellar.vessels().stream().map(v -> v.id()).toList());
      return Reply.refused("there is no vessel of that name; there are " + known);
    }
    try {
      return switch (request.deed()) {
        case NOTE -> note(request, now);
        case ACKNOWLEDGE -> acknowledge(request, now);
        default -> change(request, now);
      };
    } catch (IllegalArgumentException refused) {
      return Reply.refused(refused.getMessage());
    }
  }

  private Reply note(Request request, Instant now) {
    if (request.word().isEmpty()) {
      return Reply.refused("a note says something");
    }
    if (request.vessel().isEmpty()) {
      journal.accept(JournalEntry.station(now, "note", request.word()));
    } else {
      station.accept(new Mark(now, request.vessel(), request.word()));
    }
    return Reply.done("noted");
  }

  private Reply acknowledge(Request request, Instant now) {
    List<Alarm> wanted = new ArrayList<>();
    for (Alarm alarm : alarms.book().alarms()) {
      boolean named = request.alarm().map(kind -> kind == alarm.kind()).orElse(true);
      boolean here = request.vessel().isEmpty() || request.vessel().equals(alarm.vessel());
      if (alarm.state().wantsAcknowledging() && named && here) {
        wanted.add(alarm);
      }
    }
    for (Alarm alarm : wanted) {
      alarms.change(book -> book.acknowledge(alarm.kind(), alarm.vessel(), request.word(), now));
    }
    return wanted.isEmpty()
        ? Reply.refused("no such alarm waits to be acknowledged")
        : Reply.done("acknowledged: " + names(wanted));
  }

  private static String names(List<Alarm> alarms) {
    Map<String, List<String>> byVessel = new TreeMap<>();
    for (Alarm alarm : alarms) {
      byVessel.computeIfAbsent(alarm.vessel(), v -> new ArrayList<>()).add(alarm.kind().word());
    }
    List<String> parts = new ArrayList<>();
    byVessel.forEach(
        (vessel, words) -> parts.add((vessel + " " + String.join(", ", words)).strip()));
    return String.join("; ", parts);
  }

  private Reply change(Request request, Instant now) {
    Optional<AlarmKind> named = request.alarm();
    if (named.isEmpty()) {
      return Reply.refused("say which alarm");
    }
    if (request.vessel().isEmpty() && !named.get().isOfStation()) {
      return Reply.refused("say of which vessel with --vessel");
    }
    List<Transition> made =
        alarms.change(book -> folded(book, request, named.get(), now)).transitions();
    String name = (request.vessel() + " " + named.get().word()).strip();
    return made.isEmpty()
        ? Reply.refused("nothing to do: " + name + " is not in that state")
        : Reply.done(name + ": " + made.get(made.size() - 1).change().word());
  }

  private static AlarmBook.Folded folded(
      AlarmBook book, Request request, AlarmKind kind, Instant now) {
    String vessel = request.vessel();
    return switch (request.deed()) {
      case SHELVE ->
          book.shelve(
              kind,
              vessel,
              request.word(),
              now.plus(
                  request
                      .length()
                      .orElseThrow(() -> new IllegalArgumentException("say for how long"))),
              now);
      case UNSHELVE -> book.unshelve(kind, vessel, now);
      case OUT_OF_SERVICE -> book.outOfService(kind, vessel, request.word(), now);
      case IN_SERVICE -> book.inService(kind, vessel, now);
      default -> throw new IllegalArgumentException("that cannot be done to an alarm");
    };
  }
}

package tunwarden.alarm;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.reading.Quality;
import tunwarden.units.Display;

/** Alarms about the instruments themselves: silent, bad, or telling times that run backwards. */
final class InstrumentConditions {
  private enum Trouble {
    SILENT,
    BAD,
    TIME,
    NONE
  }

  private InstrumentConditions() {}

  static List<Condition> of(Assessment assessment, AlarmSettings settings) {
    Map<String, Observed> instruments = new TreeMap<>();
    instruments.put("pressure", assessment.pressure());
    instruments.put("temperature", assessment.temperature());
    List<Condition> all = new ArrayList<>();
    all.add(one(AlarmKind.INSTRUMENT_STALE, Trouble.SILENT, instruments, settings));
    all.add(one(AlarmKind.INSTRUMENT_BAD, Trouble.BAD, instruments, settings));
    all.add(one(AlarmKind.CLOCK, Trouble.TIME, instruments, settings));
    return all;
  }

  private static Condition one(
      AlarmKind kind, Trouble trouble, Map<String, Observed> instruments, AlarmSettings settings) {
    List<String> sentences = new ArrayList<>();
    List<String> causes = new ArrayList<>();
    int neverSeen = 0;
    boolean inService = false;
    for (Map.Entry<String, Observed> entry : instruments.entrySet()) {
      Observed observed = entry.getValue();
      inService |= observed.quality() != Quality.OUT_OF_SERVICE;
      if (trouble(observed.quality()) == trouble) {
        causes.add(entry.getKey());
        sentences.add(sentence(entry.getKey(), observed, settings.display()));
        neverSeen += observed.at().isEmpty() ? 1 : 0;
      }
    }
    if (!inService) {
      return Condition.plain(kind, Condition.Truth.SUPPRESSED, "");
    }
    Condition condition =
        Conditions.when(!causes.isEmpty(), kind, String.join(" ", sentences))
            .withCauses(Set.copyOf(causes));
    // What has never spoken has no age: it is given as long as a silence may last.
    return neverSeen > 0 && neverSeen == causes.size()
        ? condition.after(settings.stale())
        : condition;
  }

  private static Trouble trouble(Quality quality) {
    return switch (quality) {
      case STALE, NO_ANSWER, PORT_GONE -> Trouble.SILENT;
      case OUT_OF_RANGE, STUCK, LOOP_FAULT, CHECKSUM, UNREADABLE, NOT_FINITE, DISAGREES ->
          Trouble.BAD;
      case OUT_OF_ORDER -> Trouble.TIME;
      default -> Trouble.NONE;
    };
  }

  private static String sentence(String name, Observed observed, Display display) {
    String last = last(name, observed, display).map(value -> "; last " + value).orElse("");
    String age =
        observed.at().isPresent() && trouble(observed.quality()) == Trouble.SILENT
            ? ", " + Words.duration(observed.age()) + " ago"
            : "";
    return "The " + name + " reading: " + observed.quality().why() + last + age + ".";
  }

  private static Optional<String> last(String name, Observed observed, Display display) {
    if (observed.value().isEmpty()) {
      return Optional.empty();
    }
    double value = observed.value().getAsDouble();
    return Optional.of(name.equals("pressure") ? display.gauge(value) : display.temperature(value));
  }
}

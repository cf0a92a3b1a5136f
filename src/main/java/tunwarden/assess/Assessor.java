package tunwarden.assess;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Event;
import tunwarden.forecast.Outlook;
import tunwarden.reading.Quality;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Puts readings, belief and futures of one vessel together into one {@link Assessment}. Pure. */
public final class Assessor {
  private Assessor() {}

  /**
   * What is known when an assessment is due.
   *
   * @param vessel its description
   * @param now data time
   * @param pressure newest pressure, Pa gauge
   * @param temperature newest liquid temperature, K
   * @param estimate the belief, if any
   * @param outlook the futures
   * @param events events since the assessment before
   */
  public record Evidence(
      Vessel vessel,
      Instant now,
      Observed pressure,
      Observed temperature,
      Optional<Estimate> estimate,
      Outlook outlook,
      List<Event> events) {}

  /** The snapshot for the outputs. */
  public static Assessment assess(Evidence evidence) {
    return new Assessment(
        evidence.vessel(),
        evidence.now(),
        evidence.pressure(),
        evidence.temperature(),
        evidence.estimate(),
        margins(evidence),
        evidence.outlook(),
        Ladder.of(evidence.vessel().limits(), evidence.pressure(), evidence.outlook()),
        evidence.events(),
        notes(evidence));
  }

  /** No margin is spoken of without a relief setting and a pressure that can be believed. */
  private static Optional<Margins> margins(Evidence evidence) {
    Optional<ReliefSetting> relief = evidence.vessel().limits().relief();
    if (relief.isEmpty() || !evidence.pressure().isUsable()) {
      return Optional.empty();
    }
    double u95Pa = evidence.vessel().accuracy().pressureU95Pa();
    double marginPa =
        Margins.reliefPa(relief.get(), evidence.pressure().value().getAsDouble(), u95Pa);
    return Optional.of(
        new Margins(marginPa, marginPa / relief.get().setPaGauge(), u95Pa, warming(evidence)));
  }

  private static OptionalDouble warming(Evidence evidence) {
    OptionalDouble lift = evidence.outlook().liftTemperatureK();
    OptionalDouble now = evidence.temperature().value();
    return lift.isPresent() && now.isPresent()
        ? OptionalDouble.of(lift.getAsDouble() - now.getAsDouble())
        : OptionalDouble.empty();
  }

  private static List<String> notes(Evidence evidence) {
    List<String> notes = new ArrayList<>();
    addNote(notes, "pressure", evidence.pressure());
    addNote(notes, "temperature", evidence.temperature());
    evidence.estimate().map(Estimate::ignorance).filter(s -> !s.isEmpty()).ifPresent(notes::add);
    return notes;
  }

  private static void addNote(List<String> notes, String name, Observed observed) {
    if (observed.quality() == Quality.GOOD) {
      return;
    }
    if (observed.at().isEmpty()) {
      notes.add(name + ": nothing has arrived yet");
    } else if (observed.quality() == Quality.STALE) {
      notes.add(name + ": silent for " + observed.age().toSeconds() + " s");
    } else {
      notes.add(name + " " + observed.quality().why());
    }
  }
}

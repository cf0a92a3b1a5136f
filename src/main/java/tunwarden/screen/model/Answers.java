package tunwarden.screen.model;

import java.time.Instant;
import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;

/** What an answer brings about; one that will not do leaves the question open and says why. */
final class Answers {
  private Answers() {}

  static Turn take(Model model, Prompt prompt) {
    Model closed = model.edit().answered().done();
    String text = prompt.text().trim();
    try {
      return switch (prompt.purpose()) {
        case FIND -> Turn.to(find(closed, text));
        case FILTER_JOURNAL -> Turn.to(closed.edit().journal(new JournalState(0, text)).done());
        case NOTE -> note(closed, text);
        case LAB_VALUE -> labValue(closed, text);
        case ACKNOWLEDGE -> acknowledge(closed, subject(prompt), text);
        case SHELVE_REASON -> shelveReason(closed, prompt, text);
        case SHELVE_UNTIL -> shelve(closed, prompt, text);
        case VENT_TARGET -> ventTarget(closed, text);
        case VENT_ORIFICE -> ventOrifice(closed, text);
        case SEEK -> seek(closed, text);
        case MARK -> Turn.asking(closed, desk -> desk.mark(text));
        case REPORT, STOP_WORK, QUIT -> Turn.to(closed);
      };
    } catch (BadQuantityException trouble) {
      return Turn.to(model.edit().ask(prompt.troubled(trouble.getMessage())).done());
    }
  }

  static Turn yes(Model model, Prompt prompt) {
    Model closed = model.edit().answered().done();
    return switch (prompt.purpose()) {
      case QUIT -> Turn.to(closed.edit().over().done());
      case STOP_WORK -> Turn.asking(closed, Desk::stopWork);
      case REPORT -> {
        String vessel = closed.vessel().map(VesselBoard::id).orElse("");
        yield Turn.asking(closed, desk -> desk.report(vessel));
      }
      default -> Turn.to(closed);
    };
  }

  private static Alarm subject(Prompt prompt) {
    return prompt.subject().orElseThrow();
  }

  private static void need(boolean fine, String otherwise) {
    if (!fine) {
      throw new BadQuantityException(otherwise);
    }
  }

  private static Model find(Model model, String text) {
    Listing narrowed = model.listing().withFilter(text);
    Optional<VesselBoard> first = narrowed.of(model.board()).stream().findFirst();
    if (first.isEmpty()) {
      return model.withSaid("No vessel's name contains '" + text + "'.");
    }
    ModelEdit edit = model.edit().chosen(first.get().id());
    return model.page() == Page.CELLAR ? edit.listing(narrowed).done() : edit.done();
  }

  private static Turn note(Model model, String text) {
    need(!text.isEmpty(), "a note needs some words; Esc leaves it");
    String vessel = model.vessel().map(VesselBoard::id).orElse("");
    return Turn.asking(model, desk -> desk.note(vessel, text));
  }

  private static Turn labValue(Model model, String text) {
    String[] parts = text.split("±|\\+/?-", 2);
    need(parts.length == 2, "write the value and its ±: 5.2 g/L ± 0.1");
    double value = Quantities.parse(parts[0], Kind.GAS_CONTENT);
    String unit = parts[0].trim().replaceFirst("^[-+.\\d]+\\s*", "");
    String spread = parts[1].trim();
    String withUnit = spread.matches("[.\\d]+") ? spread + " " + unit : spread;
    double u95 = Quantities.parse(withUnit, Kind.GAS_CONTENT);
    need(value >= 0 && value <= MOST_DISSOLVED, "dissolved CO2 lies between 0 and 30 g/L");
    need(u95 > 0, "the uncertainty must be more than nothing");
    String vessel = model.vessel().map(VesselBoard::id).orElse("");
    return Turn.asking(model, desk -> desk.labValue(vessel, value, u95));
  }

  private static final double MOST_DISSOLVED = 30;

  private static Turn acknowledge(Model model, Alarm alarm, String word) {
    need(!word.isEmpty(), "a high alarm needs a word on what is being done");
    return Turn.asking(model, desk -> desk.acknowledge(alarm, word));
  }

  private static Turn shelveReason(Model model, Prompt prompt, String reason) {
    need(!reason.isEmpty(), "shelving needs a reason");
    Alarm alarm = subject(prompt);
    Prompt next =
        Prompt.about(
                alarm,
                Prompt.Purpose.SHELVE_UNTIL,
                "Shelve " + AlarmKeys.name(alarm) + " for (30 min, most 24 h)")
            .carrying(reason);
    return Turn.to(model.edit().ask(next).done());
  }

  private static final double MOST_SHELVED_S = 86_400;

  private static Turn shelve(Model model, Prompt prompt, String text) {
    double seconds = Quantities.parse(text, Kind.DURATION);
    need(seconds > 0 && seconds <= MOST_SHELVED_S, "shelving ends within 24 h");
    Instant until = model.board().now().plusMillis((long) (1000 * seconds));
    Alarm alarm = subject(prompt);
    return Turn.asking(model, desk -> desk.shelve(alarm, prompt.carried(), until));
  }

  private static Turn ventTarget(Model model, String text) {
    Optional<VesselBoard> vessel = model.vessel();
    double ambient =
        vessel.map(v -> v.assessment().vessel().site().ambientPaAbsolute()).orElse(0.0);
    double target = Pressure.parse(text).gaugePa(ambient);
    double now = vessel.map(v -> v.assessment().pressure().value().orElse(0)).orElse(0.0);
    need(
        target >= 0 && target <= Math.max(0, now),
        "a vent goes to between atmosphere and the present pressure");
    return Turn.to(model.edit().vent(model.vent().withTarget(target)).done());
  }

  private static Turn ventOrifice(Model model, String text) {
    double diameter = Quantities.parse(text, Kind.LENGTH);
    need(diameter >= 0.001 && diameter <= 0.1, "the vent path is between 1 mm and 100 mm wide");
    return Turn.to(model.edit().vent(model.vent().withOrifice(diameter)).done());
  }

  private static Turn seek(Model model, String text) {
    need(model.board().replay().isPresent(), "only a replay can go to another time");
    Instant to = SeekTime.parse(text, model.board().replay().get(), model.board().zone());
    return Turn.asking(model, desk -> desk.seek(to));
  }
}

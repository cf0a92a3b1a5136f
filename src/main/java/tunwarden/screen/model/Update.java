package tunwarden.screen.model;

import java.util.Optional;

/** What every key does. Pure: the same model and key give the same turn. */
public final class Update {
  private Update() {}

  /** The turn that follows a key. */
  public static Turn key(Model before, Key key) {
    if (key.is(Key.Kind.INTERRUPT)) {
      return Turn.to(before.edit().over().done());
    }
    if (before.prompt().isPresent()) {
      return PromptKeys.press(before, before.prompt().get(), key);
    }
    Model model = before.withSaid("");
    if (model.help()) {
      return Turn.to(model.edit().help(false).done());
    }
    return general(model, key)
        .or(() -> byPage(model, key))
        .or(() -> ReplayKeys.press(model, key))
        .orElseGet(() -> Turn.to(model));
  }

  /** Keys that mean the same on every page. */
  private static Optional<Turn> general(Model model, Key key) {
    Optional<Page> page = Page.openedBy(key);
    if (page.isPresent()) {
      return Optional.of(Turn.to(model.edit().page(page.get()).done()));
    }
    if (key.is(Key.Kind.ESCAPE)) {
      return Optional.of(Turn.to(back(model)));
    }
    if (!key.is(Key.Kind.TYPED)) {
      return Optional.empty();
    }
    return switch (key.character()) {
      case '?' -> Optional.of(Turn.to(model.edit().help(true).done()));
      case 'u' -> Optional.of(look(model, model.look().nextUnits()));
      case 't' -> Optional.of(look(model, model.look().nextTheme()));
      case 'g' -> Optional.of(look(model, model.look().nextGlyphs()));
      case 'q' -> Optional.of(Turn.to(quit(model)));
      case 'a' -> AlarmKeys.acknowledge(model);
      case 'h' -> AlarmKeys.shelve(model);
      default -> asking(model, key.character());
    };
  }

  /** Keys that open a question. */
  private static Optional<Turn> asking(Model model, int character) {
    return switch (character) {
      case '/' -> ask(model, findOrFilter(model));
      case 'n' -> ask(model, Prompt.of(Prompt.Purpose.NOTE, "Note on " + about(model)));
      case 'l' -> model.vessel().flatMap(v -> ask(model, labValue(v)));
      case 'r' -> model.vessel().flatMap(v -> ask(model, report(v)));
      case 'x' ->
          model.board().progress().isEmpty()
              ? Optional.empty()
              : ask(model, Prompt.of(Prompt.Purpose.STOP_WORK, "Stop the work under way?"));
      default -> Optional.empty();
    };
  }

  private static Optional<Turn> ask(Model model, Prompt prompt) {
    return Optional.of(Turn.to(model.edit().ask(prompt).done()));
  }

  private static Prompt findOrFilter(Model model) {
    return model.page() == Page.JOURNAL
        ? Prompt.of(Prompt.Purpose.FILTER_JOURNAL, "Show only what contains")
            .typing(model.journal().filter())
        : Prompt.of(Prompt.Purpose.FIND, "Find vessel by part of its name");
  }

  private static Prompt labValue(VesselBoard vessel) {
    return Prompt.of(
        Prompt.Purpose.LAB_VALUE,
        "Laboratory CO2 of " + vessel.id() + " with its ± (5.2 g/L ± 0.1)");
  }

  private static Prompt report(VesselBoard vessel) {
    return Prompt.of(Prompt.Purpose.REPORT, "Write a report of " + vessel.id() + " so far?");
  }

  private static String about(Model model) {
    return model.vessel().map(VesselBoard::id).orElse("the cellar");
  }

  private static Turn look(Model model, Look next) {
    return Turn.asking(
        model.edit().look(next).done(),
        desk -> {
          desk.remember(next);
          return "";
        });
  }

  /** Leaves at once, or asks first while alarms are unacknowledged. */
  private static Model quit(Model model) {
    long open =
        AlarmList.of(model.board()).stream().filter(a -> a.state().wantsAcknowledging()).count();
    if (open == 0) {
      return model.edit().over().done();
    }
    String many = open == 1 ? "1 alarm is" : open + " alarms are";
    return model
        .edit()
        .ask(Prompt.of(Prompt.Purpose.QUIT, many + " unacknowledged. Leave all the same?"))
        .done();
  }

  /** Escape undoes the newest narrowing first, then goes back to the cellar page. */
  private static Model back(Model model) {
    if (model.page() == Page.VESSEL && model.whatIf().open()) {
      return model.edit().whatIf(WhatIfState.SHUT).done();
    }
    if (model.page() == Page.VESSEL && model.chart().cursor().isPresent()) {
      return model.edit().chart(model.chart().withoutCursor()).done();
    }
    if (model.page() == Page.JOURNAL && !model.journal().filter().isEmpty()) {
      return model.edit().journal(JournalState.TOP).done();
    }
    if (model.page() == Page.CELLAR && !model.listing().filter().isEmpty()) {
      return model.edit().listing(model.listing().withFilter("")).done();
    }
    return model.edit().page(model.page() == Page.VENT ? Page.VESSEL : Page.CELLAR).done();
  }

  private static Optional<Turn> byPage(Model model, Key key) {
    return switch (model.page()) {
      case CELLAR -> CellarKeys.press(model, key).map(Turn::to);
      case VESSEL -> VesselKeys.press(model, key).map(Turn::to);
      case VENT -> VentKeys.press(model, key).map(Turn::to);
      case JOURNAL -> JournalKeys.press(model, key);
      case SIGNALS -> Optional.empty();
    };
  }
}

package tunwarden.screen.model;

import java.util.Optional;

/** Keys of the vent bench. */
final class VentKeys {
  private static final double STEP_PA = 5_000;
  private static final double ORIFICE_STEP_M = 0.001;

  private VentKeys() {}

  static Optional<Model> press(Model model, Key key) {
    return switch (key.kind()) {
      case UP -> Optional.of(CellarKeys.move(model, -1));
      case DOWN, TAB -> Optional.of(CellarKeys.move(model, 1));
      case LEFT -> Optional.of(target(model, -STEP_PA));
      case RIGHT -> Optional.of(target(model, STEP_PA));
      case ENTER ->
          Optional.of(
              model
                  .edit()
                  .ask(Prompt.of(Prompt.Purpose.VENT_TARGET, "Vent to (0.3 bar, 4 psi)"))
                  .done());
      case TYPED -> typed(model, key.character());
      default -> Optional.empty();
    };
  }

  private static Optional<Model> typed(Model model, int character) {
    VentState vent = model.vent();
    return switch (character) {
      case '+', '=' -> with(model, vent.withOrifice(vent.orificeM() + ORIFICE_STEP_M));
      case '-' -> with(model, vent.withOrifice(vent.orificeM() - ORIFICE_STEP_M));
      case 'd' ->
          Optional.of(
              model
                  .edit()
                  .ask(Prompt.of(Prompt.Purpose.VENT_ORIFICE, "Diameter of the vent path (12 mm)"))
                  .done());
      default -> Optional.empty();
    };
  }

  private static Optional<Model> with(Model model, VentState vent) {
    return Optional.of(model.edit().vent(vent).done());
  }

  /** Moves the target, staying between atmosphere and the present pressure. */
  private static Model target(Model model, double byPa) {
    double now = model.vessel().map(v -> v.assessment().pressure().value().orElse(0)).orElse(0.0);
    double from = model.vent().targetOr(now);
    double to = Math.max(0, Math.min(Math.max(0, now), from + byPa));
    return model.edit().vent(model.vent().withTarget(to)).done();
  }
}

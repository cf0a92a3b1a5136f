package tunwarden.screen.model;

import java.util.List;
import java.util.Optional;

/** Keys of the cellar page. */
final class CellarKeys {
  private static final int PAGE_STEP = 10;

  private CellarKeys() {}

  static Optional<Model> press(Model model, Key key) {
    return switch (key.kind()) {
      case UP -> Optional.of(move(model, -1));
      case DOWN -> Optional.of(move(model, 1));
      case PAGE_UP -> Optional.of(move(model, -PAGE_STEP));
      case PAGE_DOWN -> Optional.of(move(model, PAGE_STEP));
      case HOME -> Optional.of(move(model, -model.board().vessels().size()));
      case END -> Optional.of(move(model, model.board().vessels().size()));
      case ENTER, RIGHT -> Optional.of(model.edit().page(Page.VESSEL).done());
      case TYPED ->
          key.types('o')
              ? Optional.of(model.edit().listing(model.listing().nextSort()).done())
              : Optional.empty();
      default -> Optional.empty();
    };
  }

  /** Chooses the vessel that many places further down the list. */
  static Model move(Model model, int by) {
    List<VesselBoard> listed = model.listed();
    if (listed.isEmpty()) {
      return model;
    }
    String now = model.vessel().map(VesselBoard::id).orElse("");
    int at = 0;
    for (int i = 0; i < listed.size(); i++) {
      if (listed.get(i).id().equals(now)) {
        at = i;
      }
    }
    int next = Math.max(0, Math.min(listed.size() - 1, at + by));
    return model.edit().chosen(listed.get(next).id()).done();
  }
}

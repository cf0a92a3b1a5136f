package tunwarden.screen.view;

import tunwarden.screen.model.Model;

/** The vent bench: what a vent would do, tried before anyone turns a handle. */
final class VentView {
  private VentView() {}

  static void draw(Canvas canvas, Area area, Model model) {
    canvas.put(area.x() + 2, area.y(), "Nothing to vent.", Role.NORMAL);
  }
}

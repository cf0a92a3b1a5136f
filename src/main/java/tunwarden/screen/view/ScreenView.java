package tunwarden.screen.view;

import tunwarden.screen.model.Model;
import tunwarden.screen.model.Size;

/** The whole screen from the model. */
public final class ScreenView {
  private ScreenView() {}

  /** Draws the screen; the same model gives the same cells. */
  public static Canvas draw(Model model) {
    Size size = model.size();
    Canvas canvas = new Canvas(size.columns(), size.rows(), model.look().glyphs().isAscii());
    if (!size.isEnough()) {
      drawTooSmall(canvas, size);
      return canvas;
    }
    Area page = FrameView.draw(canvas, model);
    if (model.help()) {
      HelpView.draw(canvas, page, model);
      return canvas;
    }
    switch (model.page()) {
      case CELLAR -> CellarView.draw(canvas, page, model);
      case VESSEL -> VesselView.draw(canvas, page, model);
      case VENT -> VentView.draw(canvas, page, model);
      case JOURNAL -> JournalView.draw(canvas, page, model);
      case SIGNALS -> SignalsView.draw(canvas, page, model);
      default -> throw new IllegalStateException("no view of " + model.page());
    }
    return canvas;
  }

  private static void drawTooSmall(Canvas canvas, Size size) {
    canvas.put(0, 0, "Too small: " + size.columns() + "x" + size.rows(), Role.STRONG);
    String need = "Needs " + Size.LEAST.columns() + "x" + Size.LEAST.rows();
    canvas.put(0, 1, need + "; q leaves", Role.NORMAL);
  }
}

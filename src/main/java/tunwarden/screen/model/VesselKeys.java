package tunwarden.screen.model;

import java.time.Instant;
import java.util.Optional;

/** Keys of the vessel page: the neighbouring vessel, and the chart. */
final class VesselKeys {
  private VesselKeys() {}

  static Optional<Model> press(Model model, Key key) {
    Instant now = model.board().now();
    ChartState chart = model.chart();
    return switch (key.kind()) {
      case UP -> Optional.of(CellarKeys.move(model, -1));
      case DOWN, TAB -> Optional.of(CellarKeys.move(model, 1));
      case LEFT -> with(model, chart.moveCursor(now, -1));
      case RIGHT -> with(model, chart.moveCursor(now, 1));
      case PAGE_UP -> with(model, chart.pan(now, -1));
      case PAGE_DOWN -> with(model, chart.pan(now, 1));
      case END -> with(model, chart.follow());
      case TYPED -> typed(model, key.character());
      default -> Optional.empty();
    };
  }

  private static Optional<Model> typed(Model model, int character) {
    Instant now = model.board().now();
    ChartState chart = model.chart();
    return switch (character) {
      case 'w' -> with(model, chart.nextSpan());
      case '+', '=' -> with(model, chart.zoomIn(now));
      case '-' -> with(model, chart.zoomOut(now));
      case '[' -> with(model, chart.pan(now, -1));
      case ']' -> with(model, chart.pan(now, 1));
      case 'y' -> with(model, chart.toggleScale());
      default -> Optional.empty();
    };
  }

  private static Optional<Model> with(Model model, ChartState chart) {
    return Optional.of(model.edit().chart(chart).done());
  }
}

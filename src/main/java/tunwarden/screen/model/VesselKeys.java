package tunwarden.screen.model;

import java.time.Instant;
import java.util.Optional;

/** Keys of the vessel page: the neighbouring vessel, the chart, and the table in its place. */
final class VesselKeys {
  private VesselKeys() {}

  static Optional<Model> press(Model model, Key key) {
    Instant now = model.board().now();
    ChartState chart = model.chart();
    return switch (key.kind()) {
      case UP -> Optional.of(CellarKeys.move(model, -1));
      case DOWN, TAB -> Optional.of(CellarKeys.move(model, 1));
      case LEFT -> sideways(model, -1);
      case RIGHT -> sideways(model, 1);
      case PAGE_UP -> with(model, chart.pan(now, -1));
      case PAGE_DOWN -> with(model, chart.pan(now, 1));
      case END -> with(model, chart.follow());
      case TYPED -> typed(model, key.character());
      default -> Optional.empty();
    };
  }

  /** Along the chart, or through the table that stands in its place. */
  private static Optional<Model> sideways(Model model, int by) {
    if (!model.whatIf().open()) {
      return with(model, model.chart().moveCursor(model.board().now(), by));
    }
    int rows = model.vessel().map(v -> v.assessment().outlook().whatIfs().size()).orElse(0);
    return Optional.of(model.edit().whatIf(model.whatIf().moved(by, rows)).done());
  }

  private static Optional<Model> typed(Model model, int character) {
    Instant now = model.board().now();
    ChartState chart = model.chart();
    return switch (character) {
      case 'f' -> Optional.of(model.edit().whatIf(model.whatIf().toggled()).done());
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

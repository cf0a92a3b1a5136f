package tunwarden.screen.view;

import tunwarden.assess.Assessment;
import tunwarden.vessel.ReliefSetting;

/** A vessel's pressure as a bar from atmosphere to its relief setting, the lift zone hatched. */
final class GaugeBar {
  private static final String[] EIGHTHS = {" ", "▏", "▎", "▍", "▌", "▋", "▊", "▉", "█"};

  private GaugeBar() {}

  static void draw(
      Canvas canvas, int x, int y, int columns, Assessment assessment, Standing standing) {
    if (assessment.vessel().limits().relief().isEmpty()) {
      return;
    }
    ReliefSetting relief = assessment.vessel().limits().relief().get();
    double perCell = relief.setPaGauge() / columns;
    double now = assessment.pressure().value().orElse(0);
    Role fill = standing.mood() == Mood.CALM ? Role.NORMAL : standing.mood().role();
    for (int i = 0; i < columns; i++) {
      int eighths = (int) Math.max(0, Math.min(8, Math.round(8 * (now / perCell - i))));
      boolean lifting = (i + 0.5) * perCell >= relief.earliestLiftPaGauge();
      if (eighths > 0 && (eighths == 8 || !lifting)) {
        canvas.put(x + i, y, 1, EIGHTHS[eighths], fill);
      } else {
        canvas.put(x + i, y, 1, lifting ? "▒" : "·", Role.DIM);
      }
    }
  }
}

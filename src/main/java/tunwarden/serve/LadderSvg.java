package tunwarden.serve;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.assess.Rung;
import tunwarden.units.Display;

/**
 * The pressure ladder as SVG: one vertical scale with every pressure that matters. Labels are moved
 * apart where rungs lie close together, each joined to its place on the scale.
 */
final class LadderSvg {
  private static final int WIDTH = 340;
  private static final int SCALE_X = 74;
  private static final int LABEL_X = 108;
  private static final int LINE = 23;
  private static final int TOP = 38;
  private static final int HEADING_Y = 12;

  private LadderSvg() {}

  /** A rung and where its label stands. */
  private record Placed(Rung rung, double y, double labelY) {}

  static String of(List<Rung> rungs, Display display) {
    if (rungs.isEmpty()) {
      return "";
    }
    List<Placed> placed = place(rungs);
    double height = placed.get(placed.size() - 1).labelY() + LINE;
    StringBuilder svg = new StringBuilder();
    svg.append("<svg class=\"ladder\" role=\"img\" aria-label=\"pressure ladder\" viewBox=\"0 0 ")
        .append(WIDTH)
        .append(' ')
        .append(number(height))
        .append("\" xmlns=\"http://www.w3.org/2000/svg\">");
    text(svg, "forecast end", SCALE_X - 12, HEADING_Y, display.pressure().symbol() + " g");
    text(svg, "forecast end", WIDTH - 4, HEADING_Y, "from now");
    line(svg, "scale", SCALE_X, placed.get(0).y(), placed.get(placed.size() - 1).y());
    double now = now(rungs);
    for (Placed one : placed) {
      draw(svg, one, now, display);
    }
    return svg.append("</svg>").toString();
  }

  private static void line(StringBuilder svg, String type, double x, double y1, double y2) {
    svg.append(
        String.format(
            Locale.ROOT,
            "<line class=\"%s\" x1=\"%.1f\" y1=\"%.1f\" x2=\"%.1f\" y2=\"%.1f\"/>",
            type,
            x,
            y1,
            x,
            y2));
  }

  private static void draw(StringBuilder svg, Placed one, double now, Display display) {
    Rung rung = one.rung();
    String type = type(rung.kind());
    svg.append(
        String.format(
            Locale.ROOT,
            "<polyline class=\"%s\" points=\"%d,%.1f %d,%.1f %d,%.1f\"/>",
            type,
            SCALE_X - 5,
            one.y(),
            SCALE_X + 9,
            one.y(),
            LABEL_X - 5,
            one.labelY()));
    text(svg, type + " end", SCALE_X - 12, one.labelY(), display.pressureNumber(rung.paGauge()));
    text(svg, type, LABEL_X, one.labelY(), rung.label());
    if (rung.kind() != Rung.Kind.NOW && Double.isFinite(now)) {
      String distance = display.signedPressureNumber(rung.paGauge() - now);
      text(svg, type + " end", WIDTH - 4, one.labelY(), distance);
    }
  }

  private static void text(StringBuilder svg, String type, double x, double y, String words) {
    svg.append(
        String.format(Locale.ROOT, "<text class=\"%s\" x=\"%.1f\" y=\"%.1f\">", type, x, y + 4.5));
    svg.append(Html.escape(words)).append("</text>");
  }

  private static String type(Rung.Kind kind) {
    return switch (kind) {
      case NOW -> "now";
      case FORECAST -> "forecast";
      default -> "limit";
    };
  }

  /** Rungs come highest first; labels keep that order and never overlap. */
  private static List<Placed> place(List<Rung> rungs) {
    double top = rungs.get(0).paGauge();
    double span = Math.max(1, top - rungs.get(rungs.size() - 1).paGauge());
    double height = Math.max(150, LINE * (rungs.size() - 1.0));
    List<Placed> placed = new ArrayList<>();
    double lowest = Double.NEGATIVE_INFINITY;
    for (Rung rung : rungs) {
      double y = TOP + height * (top - rung.paGauge()) / span;
      double labelY = Math.max(y, lowest + LINE);
      placed.add(new Placed(rung, y, labelY));
      lowest = labelY;
    }
    return pushUp(placed, TOP + height);
  }

  /** What ran out below goes up again as far as the labels above leave room. */
  private static List<Placed> pushUp(List<Placed> placed, double bottom) {
    List<Placed> moved = new ArrayList<>(placed);
    double limit = bottom;
    for (int i = moved.size() - 1; i >= 0; i--) {
      Placed one = moved.get(i);
      double labelY = Math.min(one.labelY(), limit);
      moved.set(i, new Placed(one.rung(), one.y(), labelY));
      limit = labelY - LINE;
    }
    return moved;
  }

  private static double now(List<Rung> rungs) {
    return rungs.stream()
        .filter(rung -> rung.kind() == Rung.Kind.NOW)
        .mapToDouble(Rung::paGauge)
        .findFirst()
        .orElse(Double.NaN);
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.0f", value);
  }
}

package tunwarden.report.page;

import java.util.Locale;

/** Writes SVG elements. Coordinates are printed with one decimal, never by locale. */
final class Svg {
  private final StringBuilder out = new StringBuilder();

  Svg(int width, int height, String title) {
    out.append("<svg viewBox=\"0 0 ").append(width).append(' ').append(height);
    out.append("\" role=\"img\"><title>").append(escape(title)).append("</title>\n");
  }

  static String escape(String text) {
    StringBuilder safe = new StringBuilder(text.length() + 16);
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '&' -> safe.append("&amp;");
        case '<' -> safe.append("&lt;");
        case '>' -> safe.append("&gt;");
        case '"' -> safe.append("&quot;");
        case '\'' -> safe.append("&#39;");
        default -> safe.append(c < ' ' && c != '\n' && c != '\t' ? '\ufffd' : c);
      }
    }
    return safe.toString();
  }

  static String number(double value) {
    return String.format(Locale.ROOT, "%.1f", value);
  }

  Svg line(double x1, double y1, double x2, double y2, String style) {
    out.append("<line x1=\"").append(number(x1)).append("\" y1=\"").append(number(y1));
    out.append("\" x2=\"").append(number(x2)).append("\" y2=\"").append(number(y2));
    out.append("\" class=\"").append(style).append("\"/>\n");
    return this;
  }

  Svg rectangle(double x, double y, double width, double height, String style) {
    out.append("<rect x=\"").append(number(x)).append("\" y=\"").append(number(y));
    out.append("\" width=\"").append(number(width)).append("\" height=\"").append(number(height));
    out.append("\" class=\"").append(style).append("\"/>\n");
    return this;
  }

  Svg path(String d, String style) {
    if (!d.isEmpty()) {
      out.append("<path d=\"").append(d).append("\" class=\"").append(style).append("\"/>\n");
    }
    return this;
  }

  /** Text; {@code anchor} is start, middle or end. */
  Svg text(double x, double y, String anchor, String style, String text) {
    out.append("<text x=\"").append(number(x)).append("\" y=\"").append(number(y));
    out.append("\" text-anchor=\"").append(anchor).append("\" class=\"").append(style);
    out.append("\">").append(escape(text)).append("</text>\n");
    return this;
  }

  String end() {
    return out + "</svg>\n";
  }
}

package tunwarden.report.page;

import java.util.List;

/** Writes HTML; every text is escaped on its way in. */
final class Html {
  private final StringBuilder out = new StringBuilder();

  Html open(String tag) {
    out.append('<').append(tag).append(">\n");
    return this;
  }

  Html open(String tag, String style) {
    out.append('<').append(tag).append(" class=\"").append(style).append("\">\n");
    return this;
  }

  Html close(String tag) {
    out.append("</").append(tag).append(">\n");
    return this;
  }

  Html element(String tag, String text) {
    out.append('<').append(tag).append('>').append(Svg.escape(text));
    out.append("</").append(tag).append(">\n");
    return this;
  }

  Html element(String tag, String style, String text) {
    out.append('<').append(tag).append(" class=\"").append(style).append("\">");
    out.append(Svg.escape(text)).append("</").append(tag).append(">\n");
    return this;
  }

  Html list(List<String> items) {
    open("ul");
    items.forEach(item -> element("li", item));
    return close("ul");
  }

  /** Markup that is already safe, such as a plot. */
  Html raw(String markup) {
    out.append(markup);
    return this;
  }

  @Override
  public String toString() {
    return out.toString();
  }
}

package tunwarden.serve;

/** Text made safe inside HTML and SVG. */
final class Html {
  private Html() {}

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
        default -> safe.append(Character.isISOControl(c) ? ' ' : c);
      }
    }
    return safe.toString();
  }
}

package tunwarden.journal;

/** Texts from outside, made fit to be stored where people and programs will read them. */
public final class Harmless {
  private static final int LONGEST = 500;

  private Harmless() {}

  /** Without control characters (terminal escapes among them) and not over-long. */
  public static String text(String from) {
    String clean = from.replaceAll("[\\p{Cntrl}\\u2028\\u2029\\u202A-\\u202E\\u2066-\\u2069]", " ");
    return clean.length() <= LONGEST ? clean : clean.substring(0, LONGEST) + " ...";
  }

  /**
   * A cell that no spreadsheet takes for a formula: a leading sign gets a quote before it (common
   * practice, no source).
   */
  public static String cell(String from) {
    String clean = text(from).strip();
    boolean formula = !clean.isEmpty() && "=+-@\t".indexOf(clean.charAt(0)) >= 0;
    return formula ? "'" + clean : clean;
  }
}

package tunwarden.screen.model;

import java.util.Optional;

/** The pages, each with the letter that opens it. */
public enum Page {
  CELLAR("Cellar", 'c'),
  VESSEL("Vessel", 'v'),
  VENT("Vent bench", 'b'),
  JOURNAL("Journal", 'j'),
  SIGNALS("Signals", 's');

  private final String title;
  private final char letter;

  Page(String title, char letter) {
    this.title = title;
    this.letter = letter;
  }

  public String title() {
    return title;
  }

  public char letter() {
    return letter;
  }

  /** The page that key opens, if any. */
  public static Optional<Page> openedBy(Key key) {
    for (Page page : values()) {
      if (key.types(page.letter)) {
        return Optional.of(page);
      }
    }
    return Optional.empty();
  }
}

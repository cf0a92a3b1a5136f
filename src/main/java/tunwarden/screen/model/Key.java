package tunwarden.screen.model;

/**
 * One key stroke.
 *
 * @param kind which key
 * @param character the character typed when the kind is {@link Kind#TYPED}, otherwise 0
 */
public record Key(Kind kind, int character) {
  /** Keys the dashboard knows. */
  public enum Kind {
    TYPED,
    UP,
    DOWN,
    LEFT,
    RIGHT,
    PAGE_UP,
    PAGE_DOWN,
    HOME,
    END,
    ENTER,
    ESCAPE,
    BACKSPACE,
    TAB,
    /** Control-L: draw everything afresh. */
    REPAINT,
    /** Control-C: leave at once. */
    INTERRUPT,
    OTHER
  }

  /** A typed character (a code point). */
  public static Key typed(int character) {
    return new Key(Kind.TYPED, character);
  }

  /** A key that types nothing. */
  public static Key of(Kind kind) {
    return new Key(kind, 0);
  }

  public boolean is(Kind other) {
    return kind == other;
  }

  /** Whether this is that character. */
  public boolean types(int other) {
    return kind == Kind.TYPED && character == other;
  }
}

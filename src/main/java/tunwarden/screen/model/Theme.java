package tunwarden.screen.model;

/** How the screen is coloured. */
public enum Theme {
  DARK,
  LIGHT,
  MONOCHROME;

  /** The next one round. */
  public Theme next() {
    return values()[(ordinal() + 1) % values().length];
  }
}

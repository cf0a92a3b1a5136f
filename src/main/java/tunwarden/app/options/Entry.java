package tunwarden.app.options;

/**
 * A command in a list of commands. The name stands here as well as on the class, since reading it
 * from there costs more at every start than the whole list.
 *
 * @param name as on the class
 * @param type its class
 */
public record Entry(String name, Class<?> type) {
  /** The command of that name. */
  public static Entry of(String name, Class<?> type) {
    return new Entry(name, type);
  }
}

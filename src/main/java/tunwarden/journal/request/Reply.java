package tunwarden.journal.request;

/**
 * What became of a request.
 *
 * @param done whether it was carried out
 * @param text one sentence
 */
public record Reply(boolean done, String text) {
  /** It was carried out. */
  public static Reply done(String text) {
    return new Reply(true, text);
  }

  /** It was not. */
  public static Reply refused(String text) {
    return new Reply(false, text);
  }

  String line() {
    return (done ? "done " : "refused ") + text + "\n";
  }

  static Reply of(String line) {
    int space = line.indexOf(' ');
    return new Reply(line.startsWith("done "), line.substring(space + 1).strip());
  }
}

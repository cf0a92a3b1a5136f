package tunwarden.serial;

/** What can go wrong on a line and is counted. */
public enum Trouble {
  CHECKSUM("failed checksum"),
  UNREADABLE("unreadable value"),
  FOREIGN("line without a known field"),
  TOO_LONG("line too long"),
  NO_ANSWER("no answer"),
  REFUSAL("request refused"),
  BROKEN("broken answer"),
  LOST("port lost"),
  CONSUMER("reading not taken");

  private final String words;

  Trouble(String words) {
    this.words = words;
  }

  public String words() {
    return words;
  }
}

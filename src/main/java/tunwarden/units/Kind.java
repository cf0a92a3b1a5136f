package tunwarden.units;

import java.util.Arrays;
import java.util.stream.Collectors;

/** What a quantity measures; a unit belongs to exactly one kind. */
public enum Kind {
  PRESSURE("a pressure"),
  TEMPERATURE("a temperature"),
  TEMPERATURE_DIFFERENCE("a temperature difference"),
  VOLUME("a volume"),
  GAS_CONTENT("a gas content"),
  EXTRACT("an extract or gravity"),
  FRACTION("a share"),
  LENGTH("a length"),
  AREA("an area"),
  DURATION("a time"),
  RATE("a rate"),
  MASS_FLOW("a mass flow"),
  MOLARITY("a molar concentration"),
  CURRENT("a current"),
  RESISTANCE("a resistance"),
  NUMBER("a plain number");

  private final String words;

  Kind(String words) {
    this.words = words;
  }

  /** With its article, for sentences: "a pressure". */
  public String words() {
    return words;
  }

  /** The symbols a person may write for this kind, as a list for an error sentence. */
  public String symbols() {
    return Arrays.stream(Unit.values())
        .filter(unit -> unit.kind() == this)
        .map(Unit::symbol)
        .collect(Collectors.joining(", "));
  }
}

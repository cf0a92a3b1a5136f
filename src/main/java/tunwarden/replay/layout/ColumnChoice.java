package tunwarden.replay.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.reading.Quantity;

/**
 * One item of {@code --columns}: {@code pressure=Druck/mbar}.
 *
 * @param word what the column holds: time, clock, vessel, event or a quantity's word
 * @param name the column's header, or its number counted from 1
 * @param tail what stands after the last slash (a unit, or how times are written); may be empty
 */
record ColumnChoice(String word, String name, String tail) {
  private static final String OPTION = "--columns";

  /** Splits the option. */
  static List<ColumnChoice> parse(String stated) throws LayoutException {
    List<ColumnChoice> choices = new ArrayList<>();
    if (stated.isBlank()) {
      return choices;
    }
    for (String item : stated.split(",")) {
      int equals = item.indexOf('=');
      if (equals < 1 || equals == item.length() - 1) {
        throw new LayoutException(
            0, OPTION, "'" + item + "' is not of the form pressure=NAME/UNIT");
      }
      String word = item.substring(0, equals).trim();
      requireKnown(word);
      String rest = item.substring(equals + 1).trim();
      int slash = rest.lastIndexOf('/');
      choices.add(
          slash < 1
              ? new ColumnChoice(word, rest, "")
              : new ColumnChoice(word, rest.substring(0, slash), rest.substring(slash + 1)));
    }
    return choices;
  }

  private static void requireKnown(String word) throws LayoutException {
    boolean role = List.of("time", "clock", "vessel", "event").contains(word);
    if (!role && Quantity.ofWord(word).isEmpty()) {
      StringBuilder known = new StringBuilder("time, clock, vessel, event");
      for (Quantity quantity : Quantity.values()) {
        known.append(", ").append(quantity.word());
      }
      throw new LayoutException(0, OPTION, "'" + word + "' is none of " + known);
    }
  }

  Optional<Quantity> quantity() {
    return Quantity.ofWord(word);
  }

  /** Where the column stands; a header that itself contains the slash is found too. */
  int index(Table table) throws LayoutException {
    int whole = tail.isEmpty() ? -1 : table.indexOf(name + "/" + tail);
    int index = whole >= 0 ? whole : table.indexOf(name);
    if (index >= 0) {
      return index;
    }
    if (name.matches("\\d{1,3}")) {
      int number = Integer.parseInt(name);
      if (number >= 1 && number <= table.width()) {
        return number - 1;
      }
    }
    throw new LayoutException(
        table.headerLine(),
        OPTION,
        "there is no column '" + name + "'; the columns are " + table.namesInWords());
  }
}

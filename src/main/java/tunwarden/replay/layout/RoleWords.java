package tunwarden.replay.layout;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import tunwarden.reading.Quantity;
import tunwarden.units.Kind;

/**
 * What the words of a header mean: plain words of some languages and the letters of tag numbers.
 */
final class RoleWords {
  private static final Set<String> TIME =
      Set.of(
          "time",
          "timestamp",
          "datetime",
          "date",
          "zeit",
          "datum",
          "zeitstempel",
          "uhrzeit",
          "heure",
          "horodatage",
          "fecha",
          "hora",
          "data",
          "ora",
          "tijd",
          "tid",
          "tidspunkt",
          "epoch",
          "unix",
          "ts",
          "utc",
          "local",
          "stamp",
          "recorded",
          "when",
          "czas");
  private static final Set<String> PRESSURE =
      Set.of(
          "pressure",
          "press",
          "prs",
          "p",
          "druck",
          "überdruck",
          "ueberdruck",
          "kopfdruck",
          "pression",
          "presión",
          "presion",
          "pressione",
          "pressão",
          "druk",
          "tryck",
          "trykk",
          "ciśnienie",
          "tlak",
          "pi",
          "pt",
          "pit",
          "pg",
          "pabs",
          "gauge");
  private static final Set<String> TEMPERATURE =
      Set.of(
          "temperature",
          "temp",
          "tmp",
          "t",
          "temperatur",
          "température",
          "temperatura",
          "temperatuur",
          "teplota",
          "ti",
          "tt",
          "tit",
          "te");
  private static final Set<String> BAROMETER =
      Set.of("barometer", "barometric", "baro", "atmospheric", "atm", "ambient", "luftdruck");
  private static final Set<String> LEVEL =
      Set.of("level", "fill", "volume", "füllstand", "fuellstand", "niveau", "nivel", "li", "lt");
  private static final Set<String> GRAVITY =
      Set.of("gravity", "sg", "extract", "plato", "density", "extrakt", "densité", "stammwürze");
  private static final Set<String> DISSOLVED =
      Set.of("dissolved", "co2", "carbonation", "gelöst", "kohlensäure", "lab", "labor");
  private static final Set<String> HEADSPACE =
      Set.of("headspace", "gas", "ullage", "kopfraum", "top", "head");
  private static final Set<String> ELSEWHERE =
      Set.of(
          "ambient",
          "room",
          "jacket",
          "glycol",
          "coolant",
          "raum",
          "umgebung",
          "kühl",
          "supply",
          "setpoint",
          "soll",
          "sp",
          "target",
          "alarm",
          "limit",
          "outside",
          "cellar",
          "keller",
          "dew",
          "board",
          "cpu",
          "battery",
          "differential");
  private static final Set<String> VESSEL =
      Set.of(
          "vessel",
          "tank",
          "fv",
          "fermenter",
          "fermentor",
          "keg",
          "behälter",
          "behaelter",
          "gärtank",
          "cuve",
          "channel",
          "sensor",
          "device",
          "id",
          "name",
          "unit",
          "tag");
  private static final Set<String> EVENT =
      Set.of("event", "remark", "note", "notes", "comment", "bemerkung", "ereignis", "remarque");
  private static final Set<String> FILLER =
      Set.of(
          "yyyy", "mm", "dd", "hh", "ss", "s", "ms", "utc", "local", "iso8601", "iso", "text",
          "mark", "no", "nr", "-");

  private RoleWords() {}

  static boolean isTime(String header) {
    return any(HeaderText.wordsOf(header), TIME);
  }

  static boolean isVessel(String header) {
    return any(HeaderText.wordsOf(header), VESSEL);
  }

  static boolean isEvent(String header) {
    return any(HeaderText.wordsOf(header), EVENT);
  }

  /** Whether text in a line of units is only there to fill the place of a column without unit. */
  static boolean isFiller(String text) {
    List<String> words = HeaderText.wordsOf(text);
    return FILLER.containsAll(words);
  }

  /** The quantity a column of numbers holds, by its words first and its unit second. */
  static Optional<Quantity> quantity(HeaderText header) {
    List<String> words = header.words();
    if (any(words, BAROMETER) && header.unit(Kind.TEMPERATURE).isEmpty()) {
      return any(words, TEMPERATURE) ? Optional.empty() : Optional.of(Quantity.BAROMETER);
    }
    if (any(words, ELSEWHERE)) {
      return Optional.empty();
    }
    boolean pressureUnit = header.unit(Kind.PRESSURE).isPresent();
    boolean temperatureUnit = header.unit(Kind.TEMPERATURE).isPresent();
    if (pressureUnit || any(words, PRESSURE) && !temperatureUnit) {
      return Optional.of(Quantity.PRESSURE);
    }
    if (temperatureUnit || any(words, TEMPERATURE)) {
      return Optional.of(
          any(words, HEADSPACE) ? Quantity.HEADSPACE_TEMPERATURE : Quantity.TEMPERATURE);
    }
    if (any(words, LEVEL) && header.unit(Kind.VOLUME).isPresent()) {
      return Optional.of(Quantity.LEVEL);
    }
    if (any(words, GRAVITY) || header.unit(Kind.EXTRACT).isPresent()) {
      return Optional.of(Quantity.GRAVITY);
    }
    if (any(words, DISSOLVED) && header.unit(Kind.GAS_CONTENT).isPresent()) {
      return Optional.of(Quantity.DISSOLVED);
    }
    return Optional.empty();
  }

  /** What is left of a header once the words for its quantity are taken away: a vessel's name. */
  static String residue(HeaderText header) {
    StringBuilder rest = new StringBuilder();
    for (String word : header.name().split("[\\s_:.-]+")) {
      List<String> plain = HeaderText.wordsOf(word);
      boolean known =
          plain.isEmpty()
              || any(plain, PRESSURE)
              || any(plain, TEMPERATURE)
              || any(plain, HEADSPACE);
      if (!known) {
        rest.append(rest.isEmpty() ? "" : "-").append(word);
      }
    }
    return rest.toString();
  }

  private static boolean any(List<String> words, Set<String> known) {
    return words.stream().anyMatch(known::contains);
  }
}

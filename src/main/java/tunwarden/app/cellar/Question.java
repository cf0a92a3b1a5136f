package tunwarden.app.cellar;

import java.util.function.Function;
import tunwarden.config.StatedLimits;
import tunwarden.config.Texts;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.vessel.Site;

/**
 * One thing asked of the person.
 *
 * @param place its place in the template
 * @param words the question
 * @param usual what an empty answer means; null where the question may be left out, empty where it
 *     may not
 * @param check refuses an answer that will not do
 */
record Question(String place, String words, String usual, Function<String, ?> check) {
  /** A question that needs an answer. */
  static Question needed(String place, String words, Function<String, ?> check) {
    return new Question(place, words, "", check);
  }

  /** A question whose empty answer leaves the line out. */
  static Question optional(String place, String words, Function<String, ?> check) {
    return new Question(place, words, null, check);
  }

  static Question[] aboutTheSite() {
    return new Question[] {
      new Question(
          "altitude",
          "Altitude of the cellar",
          "0 m",
          text -> Site.atAltitude(Texts.of(Kind.LENGTH).apply(text))),
      optional("room", "Free volume of the room, for CO2 after a vent", Texts.of(Kind.VOLUME)),
    };
  }

  static Question[] aboutAVessel() {
    return new Question[] {
      needed("name", "Name of the vessel, such as FV1", text -> text),
      optional("title", "What is in it", text -> text),
      needed("volume", "Gross volume, such as 2000 L", Texts.of(Kind.VOLUME)),
      needed("fill", "Liquid in it, such as 1800 L", Texts.of(Kind.VOLUME)),
      new Question("liquid", "Kind of drink", "beer", Texts::liquidKind),
      needed("relief", "Set pressure on the relief valve, such as 1.5 bar", Pressure::parse),
      new Question(
          "tolerance",
          "How far below it may open: ISO, ASME or such as 0.1 bar",
          "ISO",
          StatedLimits.Tolerance::parse),
      optional("vessel", "What the vessel is rated for, such as 2.0 bar", Pressure::parse),
      optional("ambient", "What it would warm to with cooling lost, such as 24 C", Texts::kelvin),
      new Question("device", "Device profile of its instruments", "text-line", text -> text),
      needed("port", "Serial port, such as /dev/ttyUSB0 or COM3", text -> text),
      new Question("pressure-field", "Field with the pressure", "P", text -> text),
      new Question("temperature-field", "Field with the temperature", "T", text -> text),
    };
  }
}

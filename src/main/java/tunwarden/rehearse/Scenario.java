package tunwarden.rehearse;

import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Collectors;

/** The situations that can be rehearsed. */
public enum Scenario {
  SETTLED("settled", "a bright tank at rest: nothing happens", Scripts::settled),
  COOLING_LOST(
      "cooling-lost",
      "the cooling fails and the tank warms until its valve lifts",
      Scripts::coolingLost),
  SEALED_TOO_EARLY(
      "sealed-too-early",
      "a fermenter is closed with extract left to ferment",
      Scripts::sealedTooEarly),
  VENT_AND_RETURN(
      "vent-and-return",
      "a tank is vented for a moment and the pressure comes back",
      Scripts::ventAndReturn),
  REGULATOR_CREEP(
      "regulator-creep",
      "the supply regulator creeps up on a tank being carbonated",
      Scripts::regulatorCreep),
  SLOW_LEAK("slow-leak", "a fitting leaks a little", Scripts::slowLeak),
  FROZEN_SENSOR(
      "frozen-sensor",
      "the pressure signal stops following while the tank warms",
      Scripts::frozenSensor),
  UNPURGED("unpurged", "air was left in the headspace and reads as carbonation", Scripts::unpurged),
  COLD_CRASH(
      "cold-crash", "a closed, nearly flat tank is cooled towards vacuum", Scripts::coldCrash);

  private final String word;
  private final String words;
  private final Script.Maker maker;

  Scenario(String word, String words, Script.Maker maker) {
    this.word = word;
    this.words = words;
    this.maker = maker;
  }

  /** Name on the command line. */
  public String word() {
    return word;
  }

  /** What happens, for a person. */
  public String words() {
    return words;
  }

  Script script(java.util.Random random) {
    return maker.make(random);
  }

  /** The scenario with that word, if there is one. */
  public static Optional<Scenario> ofWord(String word) {
    return Arrays.stream(values()).filter(s -> s.word.equals(word)).findFirst();
  }

  /** All words, for help and error sentences. */
  public static String allWords() {
    return Arrays.stream(values()).map(Scenario::word).collect(Collectors.joining(", "));
  }
}

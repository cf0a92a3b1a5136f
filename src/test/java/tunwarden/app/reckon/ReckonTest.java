package tunwarden.app.reckon;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.app.Ran;

class ReckonTest {
  private static final String TANK = "--volume 2000L --fill 1800L --liquid beer ";

  private static JsonNode json(String line) {
    try {
      return new ObjectMapper()
          .readTree(Ran.tunwarden(("reckon " + line + " --json").split(" +")).ok());
    } catch (JsonProcessingException fault) {
      throw new AssertionError(fault);
    }
  }

  private static double number(JsonNode object, String key) {
    assertTrue(object.path(key).isNumber(), key + " in " + object);
    return object.get(key).doubleValue();
  }

  @ParameterizedTest
  @CsvSource({
    "dissolved --pressure 1bar --temperature 4C --liquid beer,"
        + " dissolved_g_per_l dissolved_volumes co2_partial_pressure_bar_a",
    "hold --target 5g/L --temperature 4C --liquid wine, pressure_bar_g",
    "warm --volume 1m3 --fill 900L --pressure 1bar --temperature 4C --to 20C --relief 1.5bar,"
        + " pressure_bar_g dissolved_g_per_l relief_temperature_c",
    "chill --volume 1m3 --fill 900L --pressure 1bar --temperature 4C --to 0C,"
        + " pressure_bar_g vacuum_margin_bar",
    "solubility --gas N2 --temperature 20C --liquid water, henry_mpa bunsen g_per_l_per_bar",
    "flow --gas CO2 --pressure 1bar --to 0bar --temperature 20C --orifice 6mm --kd 0.6,"
        + " mass_flow_kg_per_h",
  })
  void everyMainValueHasItsUncertaintyItsModelAndCautions(String line, String keys) {
    JsonNode object = json(line);
    for (String key : keys.trim().split(" ")) {
      number(object, key);
      assertTrue(number(object, "u95_" + key) > 0, key);
    }
    assertFalse(object.path("model").asText().isEmpty());
    assertTrue(object.path("cautions").isArray());
  }

  @Test
  void theEuropeanEquationIsReproduced() {
    // c = 10 p exp(-10.73797 + 2617.25/T), seen in a public copy; p = 1 bar g + 1.01325, 4 °C.
    double expected = 10 * 2.01325 * Math.exp(-10.73797 + 2617.25 / 277.15);
    JsonNode object = json("dissolved --pressure 1bar --temperature 4C --liquid beer");
    assertEquals(expected, number(object, "dissolved_g_per_l"), 0.001);
    assertEquals(expected / 1.97681, number(object, "dissolved_volumes"), 0.001);
  }

  @Test
  void gaugeAndAbsoluteAgree() {
    double gauge =
        number(
            json("dissolved --pressure 1bar --temperature 4C --liquid beer"), "dissolved_g_per_l");
    double absolute =
        number(
            json("dissolved --pressure 2.01325bara --temperature 4C --liquid beer"),
            "dissolved_g_per_l");
    assertEquals(gauge, absolute, 1e-5);
  }

  @Test
  void theSameGaugeHoldsLessOnAMountain() {
    double sea =
        number(
            json("dissolved --pressure 1bar --temperature 4C --liquid beer"), "dissolved_g_per_l");
    double high =
        number(
            json("dissolved --pressure 1bar --temperature 4C --liquid beer --altitude 2000m"),
            "dissolved_g_per_l");
    // Ambient at 2000 m is 79,495 Pa by ISO 2533.
    assertEquals(1.79495 / 2.01325, high / sea, 0.002);
  }

  @Test
  void holdIsTheInverseOfDissolved() {
    double held =
        number(json("hold --target 5.5g/L --temperature 6C --liquid beer"), "pressure_bar_g");
    double dissolved =
        number(
            json("dissolved --temperature 6C --liquid beer --pressure " + held + "bar"),
            "dissolved_g_per_l");
    assertEquals(5.5, dissolved, 1e-4);
  }

  @Test
  void warmedToItsLiftTemperatureTheVesselIsAtItsSetting() {
    String start = TANK + "--pressure 0.9bar --temperature 4C --relief 1.5bar --tolerance 0.1bar";
    JsonNode now = json("warm " + start + " --to 20C");
    double lift = number(now, "relief_temperature_c");
    double earliest = number(now, "earliest_lift_temperature_c");
    assertTrue(earliest < lift);
    assertEquals(
        1.5, number(json("warm " + start + " --to " + lift + "C"), "pressure_bar_g"), 1e-4);
    assertEquals(
        1.4, number(json("warm " + start + " --to " + earliest + "C"), "pressure_bar_g"), 1e-4);
  }

  @Test
  void warmedThenChilledItReturns() {
    JsonNode warm = json("warm " + TANK + "--pressure 0.9bar --temperature 4C --to 20C");
    double fill = 1800; // stated at 4 °C; at 20 °C it has grown by the density ratio
    double grown = fill * 1.0018;
    JsonNode back =
        json(
            "chill --volume 2000L --liquid beer --fill "
                + grown
                + "L --temperature 20C --to 4C --pressure "
                + number(warm, "pressure_bar_g")
                + "bar");
    assertEquals(0.9, number(back, "pressure_bar_g"), 0.01);
  }

  @Test
  void withoutAReliefSettingNoneIsMadeUp() {
    JsonNode object = json("warm " + TANK + "--pressure 0.9bar --temperature 4C --to 20C");
    assertTrue(object.get("relief_temperature_c").isNull());
    assertFalse(object.toString().contains("may lift"), object::toString);
  }

  @Test
  void aLiftThatIsReachedIsCautionedInWords() {
    String text =
        Ran.tunwarden(
                ("reckon warm "
                        + TANK
                        + "--pressure 0.9bar --temperature 4C --to 24C --relief 1.5bar")
                    .split(" +"))
            .ok();
    assertTrue(text.contains("never block or reset"), text);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "reckon | Name what to reckon: dissolved, hold, warm, chill,",
        "reckon disolved | There is nothing called 'disolved'; did you mean 'dissolved'",
        "reckon dissolved --temperature 4C --liquid beer | Missing required option: '--pressure",
        "reckon dissolved --pressure 1bar --temperature 4C | --liquid is missing; name the drink",
        "reckon dissolved --pressure 1.0 --temperature 4C --liquid beer"
            + " | --pressure: '1.0' has no unit; for a pressure use one of Pa, bar,",
        "reckon dissolved --pressure 1,0bar --temperature 4C --liquid beer"
            + " | --pressure: '1,0bar' has a comma in it; write the decimal point as '.'",
        "reckon dissolved --pressure -2bar --temperature 4C --liquid beer"
            + " | the pressure lies below a perfect vacuum",
        "reckon dissolved --pressure 1bar --temperature -300C --liquid beer"
            + " | --temperature: '-300C' is below absolute zero",
        "reckon dissolved --pressure 1bar --temperature 4C --liquid beer --fil 900L"
            + " | There is no option '--fil'; did you mean '--fill'",
        "reckon hold --target 5g/L --temperature 4C --liquid beer --gas N2"
            + " | the gas N2 holds no CO2 to dissolve",
        "reckon hold --target 5 --temperature 4C --liquid beer | --target: '5' has no unit;",
        "reckon warm --liquid beer --pressure 1bar --temperature 4C --to 20C"
            + " | --volume is missing;",
        "reckon warm --volume 1m3 --fill 900L --pressure 1bar --temperature 4C --to 99C"
            + " | --to: write a temperature from -2.0 °C to 60.0 °C",
        "reckon solubility --gas 70N2/30CO2 --temperature 4C --liquid water"
            + " | --gas: name one gas here, not a blend",
        "reckon flow --gas CO2 --pressure 1bar --to 0bar --temperature 4C --orifice 0mm --kd 0.6"
            + " | --orifice: '0mm' is no opening; write a diameter above zero",
        "reckon flow --gas CO2 --pressure 1bar --to 0bar --temperature 4C --orifice 5mm --kd 1.6"
            + " | --kd: '1.6' is not a number above 0 and at most 1",
        "reckon solubility --gas CO2 --temperature 4C --liquid water --salt Kryptonite=1mol/L"
            + " | ",
      })
  void badInputIsOneSentence(String line, String beginning) {
    String told = Ran.tunwarden(line.split(" +")).refused();
    assertTrue(told.startsWith(beginning == null ? "" : beginning), told);
  }

  @ParameterizedTest
  @ValueSource(strings = {"us", "si"})
  void theTextIsInTheUnitsAskedFor(String units) {
    String text =
        Ran.tunwarden(
                ("reckon dissolved --pressure 1bar --temperature 4C --liquid beer --units " + units)
                    .split(" "))
            .ok();
    assertTrue(text.contains(units.equals("us") ? "29.1 ± 0.5 psi" : "200.5 ± 3.2 kPa"), text);
  }
}

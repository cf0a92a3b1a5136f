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
import tunwarden.app.Ran;
import tunwarden.forecast.ReferenceRows;

/**
 * The forecasts as commands: keys, exit codes, refusals. What they compute is tested beside them.
 */
class ForecastReckonTest {
  private static final String TANK =
      "--volume 2000L --fill 1800L --liquid beer --pressure 1bar --temperature 4C ";

  private static Ran run(String line) {
    return Ran.tunwarden(("reckon " + line).replace("air-changes ", "air-changes=").split(" +"));
  }

  private static JsonNode json(String line) {
    return parsed(run(line + " --json").ok());
  }

  private static JsonNode parsed(String text) {
    try {
      return new ObjectMapper().readTree(text);
    } catch (JsonProcessingException fault) {
      throw new AssertionError(text, fault);
    }
  }

  private static double number(JsonNode object, String key) {
    assertTrue(object.path(key).isNumber(), key + " in " + object);
    return object.get(key).doubleValue();
  }

  @ParameterizedTest
  @CsvSource({
    "vent TANK --to 0.2bar --orifice 15mm --kd 0.6 --room 180m3 --air-changes 2/h,"
        + " vented_at_once_g vented_at_once_normal_l released_if_held_g rebound_bar_g"
        + " supersaturation blowdown_s room_ppm room_ppm_if_held room_peak_ppm_ventilated",
    "seal TANK --gravity 1.014SG --final-gravity 1.012SG --relief 3bar --target 2.6vol,"
        + " co2_to_come_g_per_l pressure_bar_g dissolved_g_per_l hold_bar_g",
    "relief --relief 1.5bar --orifice 15mm --kd 0.6, capacity_kg_per_h",
    "vacuum TANK --cool-to 0C --caustic 50% --draw 100L,"
        + " after_cooling_bar_g after_caustic_bar_g after_drawing_bar_g vacuum_margin_bar",
  })
  void everyMainValueHasItsUncertaintyItsModelAndCautions(String line, String keys) {
    JsonNode object = json(line.replace("TANK", TANK));
    for (String key : keys.trim().split(" ")) {
      number(object, key);
      assertTrue(number(object, "u95_" + key) > 0, key);
    }
    assertFalse(object.path("model").asText().isEmpty());
    assertTrue(object.path("cautions").isArray());
  }

  @Test
  void theRoomFollowsTheGasThatLeft() {
    JsonNode vent = json("vent " + TANK + "--to 0.2bar --room 180m3");
    double once = number(vent, "vented_at_once_g") / 1000 / 1.8393 / 180 * 1e6;
    assertEquals(420 + once, number(vent, "room_ppm"), 1);
    double held = once + number(vent, "released_if_held_g") / 1000 / 1.8393 / 180 * 1e6;
    assertEquals(420 + held, number(vent, "room_ppm_if_held"), 2);
    assertFalse(vent.has("room_peak_ppm_ventilated"));
    assertEquals(
        ReferenceRows.of("co2_exposure_limits").stream()
            .filter(r -> r.getField("value_ppm").matches("\\d+"))
            .filter(r -> !r.getField("status").startsWith("vacated"))
            .count(),
        vent.get("exposure_limits").size());
  }

  @Test
  void theStagedPlanEndsAtTheTargetWithinTheBound() {
    JsonNode plan = json("vent " + TANK + "--to 0bar --foam-bound 30%").get("plan");
    assertTrue(plan.size() > 2);
    plan.forEach(step -> assertTrue(number(step, "supersaturation") <= 0.301, step.toString()));
    assertEquals(0, number(plan.get(plan.size() - 1), "to_bar_g"), 1e-4);
  }

  @Test
  void sealingSaysWhetherTheValveLifts() {
    String question = "seal " + TANK + "--gravity 6P --final-gravity 3P ";
    JsonNode lifts = json(question + "--relief 1.5bar");
    assertTrue(lifts.get("lifts").booleanValue());
    assertTrue(number(lifts, "time_to_lift_low_h") < number(lifts, "time_to_lift_h"));
    assertTrue(json(question).get("lifts").isNull());
    JsonNode calm = json("seal " + TANK + "--gravity 3P --final-gravity 3P --relief 1.5bar");
    assertFalse(calm.get("lifts").booleanValue());
  }

  @Test
  void dryCidersMayEndBelowWater() {
    JsonNode object =
        json(
            "seal --volume 1000L --fill 900L --liquid cider --pressure 0bar --temperature 15C"
                + " --gravity 1.002SG --final-gravity 0.998SG");
    assertTrue(number(object, "co2_to_come_g_per_l") > 3);
  }

  @Test
  void warmingWithATimeConstantSaysWhen() {
    JsonNode object = json("warm " + TANK + "--to 24C --relief 1.5bar --time-constant 30h");
    double likely = number(object, "time_to_lift_h");
    assertTrue(number(object, "time_to_lift_low_h") < likely, object.toString());
    // at rest with its gas all the time: τ ln((Ta − T0)/(Ta − Tl)), the soonest there is
    double lift = number(object, "earliest_lift_temperature_c");
    double soonest = 30 * Math.log((24 - 4) / (24 - lift));
    assertTrue(number(object, "time_to_lift_low_h") > 0.98 * soonest, object.toString());
  }

  @Test
  void anInadequateValveIsANo() {
    String valve =
        "relief --relief 1.5bar --orifice 15mm --kd 0.6 --volume 5000L --fill 4500L --liquid beer ";
    JsonNode yes = json(valve + "--warming 5C --supply 8bar --supply-orifice 3mm");
    assertTrue(yes.get("adequate").booleanValue());
    assertEquals(3, yes.get("demand_kg_per_h").size());
    // 1.6273 g/L/h at the screening bound (fermentation_rate_conversion.csv, computed)
    assertEquals(4.5 * 1.6273, number(yes.get("demand_kg_per_h"), "fermentation"), 0.01);
    Ran no = run(valve + "--fire-area 12m2 --json");
    assertEquals(1, no.code(), no.err());
    JsonNode object = parsed(no.out());
    assertFalse(object.get("adequate").booleanValue());
    assertTrue(number(object.get("share_used"), "fire") > 1);
    assertTrue(object.get("cautions").toString().contains("licensed engineer"));
  }

  @Test
  void withoutASourceNothingIsCalledAdequate() {
    JsonNode object = json("relief --relief 1.5bar --orifice 15mm --kd 0.6");
    assertTrue(object.get("adequate").isNull());
    assertEquals(0, object.get("demand_kg_per_h").size());
  }

  @ParameterizedTest
  @CsvSource({
    "vent TANK --to 1.2bar, above the present pressure",
    "vent TANK --to 0.2bar --relief 0.5bar, below the present pressure",
    "vent TANK --to 0.2bar --orifice 3m, wider than a vessel",
    "vent TANK --to 0.2bar --kd 0.6, needs an --orifice",
    "vent TANK --to 0.2bar --air-changes 2/h, needs a --room",
    "vent TANK --to -0.2bar, ends at 0 bar",
    "vent TANK --to 0.2, has no unit",
    "seal TANK --gravity 3P --final-gravity 5P, exchange them",
    "seal TANK --gravity 1048SG --final-gravity 5P, no drink's extract",
    "relief --orifice 15mm --kd 0.6, --relief is missing",
    "relief --relief 1bar --orifice 15mm --kd 0.6 --warming 5C, have no size",
    "relief --relief 1bar --orifice 15mm --kd 0.6 --supply 8bar, go together",
    "relief --relief 1bar --orifice 15mm --kd 0.6 --pressure 2bar, below the present pressure",
    "relief --relief 1bar --orifice 3m --kd 0.6 --volume 50L --fill 45L, wider than a vessel",
    "warm TANK --to 24C --time-constant 0h, above zero",
    "warm TANK --to 24C --relief 0.8bar, below the present pressure",
    "chill TANK --to 0C --relief 0.8bar, below the present pressure",
    "vacuum TANK, say what happens",
    "vacuum TANK --cool-to 10C, to the present 4.0 °C",
    "vacuum TANK --draw 1900L, more than the vessel holds",
    "vent --volume 50L --fill 50L --pressure 1bar --temperature 4C --to 0bar, full to the brim",
  })
  void whatMakesNoSenseIsAnsweredInOneSentence(String line, String part) {
    String sentence = run(line.replace("TANK", TANK)).refused();
    assertTrue(sentence.contains(part), sentence);
    assertFalse(sentence.contains("Exception"), sentence);
  }

  @Test
  void theTextFitsEightyColumns() {
    String text = run("vent " + TANK + "--to 0.2bar --orifice 15mm --room 180m3").ok();
    text.lines().forEach(line -> assertTrue(line.length() <= 80, line));
    assertTrue(text.contains("in steps"), text);
  }
}

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

/** What answers say beside their numbers: spread, assumptions, cautions, in the units asked for. */
class SaidInReckonTest {
  private static final String TANK =
      "--volume 2000L --fill 1800L --liquid beer --pressure 1bar --temperature 4C ";

  private static Ran run(String line) {
    return Ran.tunwarden(("reckon " + line.replace("TANK", TANK)).split(" +"));
  }

  private static JsonNode json(String line) {
    try {
      return new ObjectMapper().readTree(run(line + " --json").ok());
    } catch (JsonProcessingException fault) {
      throw new AssertionError(line, fault);
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "dissolved --pressure 1bar --temperature 4C --liquid beer",
        "hold --target 5g/L --temperature 4C --liquid beer",
        "warm TANK --to 14C --relief 1.5bar",
        "chill TANK --to 0C",
        "vent TANK --to 0.3bar --orifice 15mm --room 180m3",
        "seal TANK --gravity 4P --final-gravity 3P --relief 3bar",
        "supply TANK --supply 8bar --supply-flow 30kg/h --relief 1.5bar",
        "relief --relief 1.5bar --orifice 15mm --kd 0.6 --supply 8bar --supply-orifice 3mm",
        "vacuum TANK --cool-to 0C",
        "solubility --gas CO2 --temperature 20C --liquid water",
        "flow --gas CO2 --pressure 1.5bar --to 0bar --temperature 20C --orifice 6mm --kd 0.6",
      })
  void everyAnswerSaysItsSpreadAndWhatItAssumes(String line) {
    String text = run(line).ok();
    assertTrue(text.lines().anyMatch(said -> said.startsWith("assumes  ")), text);
    assertTrue(text.contains(" ± ") || text.contains(" to "), text);
    assertTrue(text.lines().allMatch(said -> said.length() <= 80), text);
    assertFalse(json(line).get("assumptions").isEmpty());
  }

  /** 1.40 bar = 20.3 psi, 0.02 bar = 0.3 psi. */
  @Test
  void sentencesAreInTheUnitsAskedForAndJsonIsMetric() {
    String line = "warm TANK --to 24C --relief 1.5bar --air 0.1bar --units us";
    String text = run(line).ok();
    assertFalse(text.contains("bar"), text);
    assertFalse(text.contains("°C"), text);
    assertTrue(text.contains("it may open from 20.3 psi g"), text);
    assertTrue(text.contains("1.5 psi of air left in it"), text);
    assertTrue(json(line).get("cautions").toString().contains("from 1.40 bar g"));
  }

  /** The margin's uncertainty is that of the pressure it comes from, not the gauge's alone. */
  @Test
  void theVacuumMarginCarriesTheUncertaintyOfItsForecast() {
    JsonNode one = json("vacuum TANK --cool-to 0C --draw 100L --vacuum-limit -0.02bar");
    double drawn = one.get("after_drawing_bar_g").doubleValue();
    assertEquals(drawn + 0.02, one.get("vacuum_margin_bar").doubleValue(), 1e-6);
    assertEquals(
        one.get("u95_after_drawing_bar_g").doubleValue(),
        one.get("u95_vacuum_margin_bar").doubleValue(),
        1e-9);
    assertTrue(one.get("u95_vacuum_margin_bar").doubleValue() > 0.011, "more than the gauge's");
  }

  @Test
  void aFailedSupplyIsReckonedOverTime() {
    JsonNode fast = json("supply TANK --supply 8bar --supply-orifice 3mm --relief 1.5bar");
    assertTrue(fast.get("lifts").booleanValue());
    double lift = fast.get("time_to_lift_s").doubleValue();
    assertTrue(lift < fast.get("time_to_set_s").doubleValue());
    double before = 0;
    for (JsonNode point : fast.get("course")) {
      assertTrue(point.get("after_s").doubleValue() > before, point.toString());
      before = point.get("after_s").doubleValue();
    }
    JsonNode unknown = json("supply TANK --supply 8bar --relief 1.5bar");
    assertTrue(unknown.get("time_to_lift_s").isNull());
    assertEquals(0, unknown.get("course").size());
  }

  @ParameterizedTest
  @CsvSource({
    "supply TANK, --supply is missing",
    "supply TANK --supply 0.8bar --supply-flow 2kg/h, nothing would flow in",
    "supply TANK --supply 8bar --supply-flow 2kg/h --supply-orifice 3mm, not both",
    "supply TANK --supply 8bar --supply-orifice 3m, wider than a vessel",
    "supply TANK --supply 8bar --supply-flow 0kg/h, not above zero",
  })
  void aSupplyThatMakesNoSenseIsRefused(String line, String part) {
    String sentence = run(line).refused();
    assertTrue(sentence.contains(part), sentence);
  }

  /** Water swells by 0.7793 % from 2 to 40 °C (fill_limits_water.csv, computed). */
  @Test
  void warmingTellsWhereNoHeadspaceIsLeft() {
    JsonNode brim =
        json(
            "warm --volume 1000L --fill 992.267L --liquid water --pressure 1bar"
                + " --temperature 2C --to 45C");
    assertEquals(40, brim.get("liquid_full_temperature_c").doubleValue(), 0.2);
    assertTrue(brim.get("cautions").toString().contains("no headspace is left"));
    assertTrue(json("warm TANK --to 24C").get("liquid_full_temperature_c").isNull());
  }
}

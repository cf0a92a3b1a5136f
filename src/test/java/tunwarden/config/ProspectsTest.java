package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.vessel.Prospects;

class ProspectsTest {
  private static Prospects read(String lines) {
    return Cellars.parse(Cellars.LEAST.replace("liquid = \"beer\"", "liquid = \"beer\"\n" + lines))
        .vessel("FV2")
        .orElseThrow()
        .prospects();
  }

  @Test
  void nothingIsForeseenOfWhatWasNotTold() {
    assertEquals(Prospects.NONE, read(""));
  }

  @Test
  void whatWasToldIsRead() {
    Prospects told =
        read(
            """
            ambient = "24 C"
            time-constant = "30 h"
            relief-valve = { orifice = "15 mm", kd = "0.6" }
            fire-area = "12 m2"
            ferment = { original-gravity = "12 P", gravity = "4 P", final-gravity = "2.5 P", extract-drop = "1.5 P" }
            target = { carbonation = "5.0 g/L", temperature = "4 C" }
            supply = { pressure = "8 bar", orifice = "3 mm" }
            """);
    assertEquals(108_000, told.warmingS().orElseThrow(), 1e-9);
    assertEquals(12, told.fireM2().orElseThrow(), 1e-9);
    Prospects.Ferment ferment = told.ferment().orElseThrow();
    assertEquals(12, ferment.originalPlato().orElseThrow(), 1e-9);
    assertEquals(4, ferment.nowPlato().orElseThrow(), 1e-9);
    assertEquals(2.5, ferment.finalPlato(), 1e-9);
    assertEquals(1.5, ferment.dropPlatoPerDay().orElseThrow(), 1e-9);
    assertEquals(5, told.target().orElseThrow().kgPerM3(), 1e-9);
    assertEquals(277.15, told.target().orElseThrow().atK().orElseThrow(), 1e-9);
    assertEquals(8e5, told.supply().orElseThrow().paGauge(), 1e-6);
    assertEquals(0.6, told.supply().orElseThrow().seat().orElseThrow().dischargeCoefficient());
  }

  @Test
  void aFlowMayStandForTheOpeningOfTheSupply() {
    Prospects.Supply supply =
        read("supply = { pressure = \"9.1 bara\", flow = \"36 kg/h\" }").supply().orElseThrow();
    assertEquals(9.1e5 - 101_325, supply.paGauge(), 1e-6);
    assertEquals(0.01, supply.kgPerS().orElseThrow(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "time-constant = \"30 h\" | vessel.FV2.time-constant: write with it what the vessel warms"
            + " to: ambient = \"24 C\"",
        "ambient = \"24 C\"\\ntime-constant = \"0 h\" | vessel.FV2.time-constant: '0 h' is not"
            + " above zero",
        "fire-area = \"12 m2\" | vessel.FV2.fire-area: it is held against a [relief-valve];"
            + " describe that too",
        "ferment = { gravity = \"4 P\" } | vessel.FV2.ferment: 'final-gravity' is missing; write for"
            + " example final-gravity = \"1.010 SG\"",
        "ferment = { gravity = \"4 P\", final-gravity = \"5 P\" } |"
            + " vessel.FV2.ferment.final-gravity: it is above the present gravity; exchange them",
        "ferment = { original-gravity = \"3 P\", gravity = \"4 P\", final-gravity = \"2 P\" } |"
            + " vessel.FV2.ferment.original-gravity: it is below the later ones; check both",
        "ferment = { final-gravity = \"60 P\" } | vessel.FV2.ferment.final-gravity: '60 P' is no"
            + " drink's extract; write from -5 to 50 P or 0.980 to 1.230 SG",
        "ferment = { final-gravity = \"2 P\", extract-drop = \"-1 P\" } |"
            + " vessel.FV2.ferment.extract-drop: '-1 P' is not above zero",
        "target = { temperature = \"4 C\" } | vessel.FV2.target: 'carbonation' is missing; write for"
            + " example carbonation = \"5.0 g/L\"",
        "supply = { pressure = \"0 bar\" } | vessel.FV2.supply.pressure: '0 bar' is not above zero",
        "supply = { pressure = \"8 bar\", orifice = \"3 mm\", flow = \"9 kg/h\" } |"
            + " vessel.FV2.supply.flow: write orifice or flow, not both",
        "supply = { pressure = \"8 bar\", kd = \"0.6\" } | vessel.FV2.supply.kd: it belongs to an"
            + " orifice, as orifice = \"3 mm\"",
        "supply = { pressure = \"8 bar\", orifice = \"3 m\" } | vessel.FV2.supply.orifice: an"
            + " orifice of 3000 mm is wider than a vessel of 2000 L; check its unit",
        "relief-valve = { orifice = \"15 m\", kd = \"0.6\" } | vessel.FV2.relief-valve.orifice: an"
            + " orifice of 15000 mm is wider than a vessel of 2000 L; check its unit",
        "supply = { presure = \"8 bar\", pressure = \"8 bar\" } | vessel.FV2.supply.presure: there"
            + " is no such key here; did you mean 'pressure'?",
      })
  void whatCannotBeIsToldWithItsLineAndKey(String lines, String sentence) {
    String[] written = lines.replace("\\n", "\n").split("\n");
    BadCellarException fault =
        assertThrows(BadCellarException.class, () -> read(String.join("\n", written)));

    int last = 4 + written.length;
    List<String> expected = List.of("cellar.toml line " + last + ", " + sentence);
    assertEquals(expected, fault.problems());
  }
}

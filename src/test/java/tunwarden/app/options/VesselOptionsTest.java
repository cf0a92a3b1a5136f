package tunwarden.app.options;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Vessel;

class VesselOptionsTest {
  private static VesselOptions parse(String... args) {
    VesselOptions options = new VesselOptions();
    CommandLine.populateCommand(options, args);
    return options;
  }

  @Test
  void everyOptionReachesTheVessel() {
    Vessel vessel =
        parse(
                ("--volume 2000L --fill 18hL --liquid beer --abv 5.2% --extract 3.9P --method chart"
                        + " --gas 70N2/30CO2 --air 0.2bar --closure sealed --relief 1.5bar"
                        + " --tolerance 50mbar --limit 2bar --vacuum-limit -0.02bar"
                        + " --ambient 0.95bar --gauge-accuracy 5mbar --thermometer-accuracy 0.1C"
                        + " --fill-accuracy 10L --sugar 5g/L --salt NaCl=0.5mol/L")
                    .split(" "))
            .vessel("V");
    assertEquals(2, vessel.volumeM3());
    assertEquals(1.8, vessel.fillM3(), 1e-12);
    assertEquals(LiquidKind.BEER, vessel.liquid().kind());
    assertEquals(0.052, vessel.liquid().alcoholByVolume().orElseThrow(), 1e-12);
    assertEquals(OptionalDouble.of(3.9), vessel.liquid().extractPlato());
    assertEquals(OptionalDouble.of(5), vessel.liquid().sugarKgPerM3());
    assertEquals(BeerMethod.CHART, vessel.liquid().beerMethod());
    assertEquals(500, vessel.liquid().saltMolPerM3().get("NaCl"));
    assertEquals(0.7, vessel.gas().fraction(Gas.N2), 1e-12);
    assertEquals(20_000, vessel.contents().airPaAbsolute(), 1e-9);
    assertEquals(Closure.SEALED, vessel.closure());
    assertEquals(1.45e5, vessel.limits().relief().orElseThrow().earliestLiftPaGauge(), 1e-9);
    assertEquals(2e5, vessel.limits().vesselPaGauge().orElseThrow(), 1e-9);
    assertEquals(-2000, vessel.limits().vacuumPaGauge().orElseThrow(), 1e-9);
    assertEquals(95_000, vessel.site().ambientPaAbsolute(), 1e-9);
    assertEquals(500, vessel.accuracy().pressureU95Pa(), 1e-9);
    assertEquals(0.1, vessel.accuracy().temperatureU95K(), 1e-12);
    assertEquals(0.010, vessel.accuracy().fillU95M3(), 1e-12);
  }

  @Test
  void nothingIsMadeUp() {
    Vessel vessel = parse("--volume", "900 L", "--fill", "800 L").vessel("V");
    assertTrue(vessel.limits().relief().isEmpty());
    assertTrue(vessel.limits().vesselPaGauge().isEmpty());
    assertEquals(101_325, vessel.site().ambientPaAbsolute());
    assertFalse(parse().areGiven());
    assertTrue(parse("--relief", "1bar").areGiven());
  }

  @Test
  void absoluteSettingsAreCountedFromTheSite() {
    Vessel vessel =
        parse("--volume=1m3", "--fill=900L", "--relief=2.0bara", "--altitude=2000m").vessel("V");
    assertEquals(
        2.0e5 - 79_495.2, vessel.limits().relief().orElseThrow().setPaGauge(), 0.1, "ISO 2533");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "--volume=1m3 | --fill is missing; write it as '--fill 900L'",
        "--volume=1m3 --fill=2m3 | --fill: the fill is larger than the volume; check both",
        "--volume=1m3 --fill=900L --relief=3bar --limit=2bar"
            + " | --relief: the setting is above what the vessel is rated for; check both",
        "--volume=1m3 --fill=900L --relief=1bar --tolerance=1bar"
            + " | --tolerance: it is as wide as the setting; check both",
        "--volume=1m3 --fill=900L --tolerance=1bar"
            + " | --tolerance: give the relief setting it belongs to",
        "--volume=1m3 --fill=900L --vacuum-limit=0.1bar"
            + " | --vacuum-limit: write zero or a negative gauge pressure",
        "--volume=1m3 --fill=900L --altitude=10m --ambient=1bar"
            + " | give --ambient or --altitude, not both",
      })
  void whatCannotBeIsRefused(String args, String sentence) {
    VesselOptions options = parse(args.trim().split(" "));
    assertEquals(
        sentence, assertThrows(BadInputException.class, () -> options.vessel("V")).getMessage());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "--volume=900 | '900' has no unit; for a volume use one of m3, L, hL, mL",
        "--fill=-1L | '-1L' is negative; write zero or more",
        "--liquid=mead | 'mead' is not a liquid; write one of water, beer, wine, sparkling-wine,"
            + " cider, soft-drink, mineral-water, kombucha",
        "--abv=105% | '105%' is more than the whole; write at most 100 %",
        "--ambient=10bar | no inhabited place has that air pressure; write 0.5 to 1.1 bar, absolute",
        "--tolerance=0.1bara | '0.1bara' is a difference; write it without 'a'",
      })
  void aTextThatIsNoQuantityIsRefused(String arg, String sentence) {
    ParameterException fault = assertThrows(ParameterException.class, () -> parse(arg.trim()));
    assertEquals(sentence, fault.getCause().getMessage());
  }
}

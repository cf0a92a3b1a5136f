package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Priority;
import tunwarden.journal.RecorderSettings;
import tunwarden.notice.NoticeRules;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.vessel.Closure;
import tunwarden.vessel.ReliefRule;
import tunwarden.vessel.Vessel;

class CellarFileTest {
  private static final String FULL =
      """
      [site]
      altitude = "120 m"
      room = { volume = "180 m3", air-changes = "2 /h" }

      [vessel.FV2]
      title = "pale ale"
      volume = "2000 L"
      fill = "1800 L"
      fill-accuracy = "20 L"
      liquid = { kind = "beer", abv = "5.2 %", extract = "3.9 P", method = "chart" }
      gas = "70N2/30CO2"
      air = "20 mbar"
      closure = "sealed"
      limits = { relief = "1.5 bar", tolerance = "0.1 bar", vessel = "2.0 bar", vacuum = "-0.02 bar" }
      relief-valve = { orifice = "15 mm", kd = "0.6" }
      ambient = "24 C"

      [vessel.FV2.readings]
      pressure = { device = "text-line", port = "/dev/ttyUSB0", field = "P", accuracy = "5 mbar" }
      temperature = { device = "text-line", port = "/dev/ttyUSB0", field = "T", accuracy = "0.2 C" }
      level = { device = "holding-registers", port = "/dev/ttyUSB1", field = "level", address = 7, every = "10 s", baud = 19200 }
      """;

  @Test
  void everythingSaidIsRead() {
    Cellar cellar = Cellars.parse(FULL);
    Vessel vessel = cellar.vessel("FV2").orElseThrow();
    assertEquals("pale ale", vessel.title());
    assertEquals(2, vessel.volumeM3(), 1e-12);
    assertEquals(1.8, vessel.fillM3(), 1e-12);
    assertEquals(LiquidKind.BEER, vessel.liquid().kind());
    assertEquals(BeerMethod.CHART, vessel.liquid().beerMethod());
    assertEquals(0.052, vessel.liquid().alcoholByVolume().orElseThrow(), 1e-12);
    assertEquals(0.7, vessel.gas().fraction(Gas.N2), 1e-12);
    assertEquals(2000, vessel.contents().airPaAbsolute(), 1e-9);
    assertEquals(Closure.SEALED, vessel.closure());
    assertEquals(1.4e5, vessel.limits().relief().orElseThrow().earliestLiftPaGauge(), 1e-9);
    assertEquals(-2000, vessel.limits().vacuumPaGauge().orElseThrow(), 1e-9);
    assertEquals(0.015, vessel.orifice().orElseThrow().diameterM(), 1e-12);
    assertEquals(297.15, vessel.warmToK().orElseThrow(), 1e-9);
    assertEquals(500, vessel.accuracy().pressureU95Pa(), 1e-9);
    assertEquals(0.02, vessel.accuracy().fillU95M3(), 1e-12);
    assertEquals(99_891.7, vessel.site().ambientPaAbsolute(), 0.1, "ISO 2533 at 120 m");
    assertEquals(2.0 / 3600, vessel.site().room().orElseThrow().airChangesPerS(), 1e-12);

    Instrument level = cellar.instruments().get(2);
    assertEquals(Quantity.LEVEL, level.quantity());
    assertEquals(Optional.of(7), level.address());
    assertEquals(Optional.of(Duration.ofSeconds(10)), level.every());
    assertEquals(Optional.of(19_200), level.baud());
  }

  /** The file that the description of the program shows, word for word. */
  @Test
  void theFileOfTheInterfaceIsRead() {
    Cellar cellar =
        Cellars.parse(
            """
            [site]
            altitude = "120 m"                      # or barometer = { … }
            room = { volume = "180 m3", air-changes = "2 /h" }

            [vessel.FV2]
            title = "pale ale"
            volume = "2000 L"
            fill = "1800 L"
            liquid = { kind = "beer", abv = "5.2 %", extract = "3.9 P" }
            gas = "CO2"
            closure = "infer"
            limits = { relief = "1.5 bar", tolerance = "0.1 bar", vessel = "2.0 bar", vacuum = "-0.02 bar" }
            relief-valve = { orifice = "15 mm", kd = "0.6" }
            ambient = "24 C"                        # what it would warm to with cooling lost

            [vessel.FV2.readings]
            pressure = { device = "text-line", port = "/dev/ttyUSB0", field = "P", accuracy = "10 mbar" }
            temperature = { device = "text-line", port = "/dev/ttyUSB0", field = "T", accuracy = "0.2 C" }

            [alarms]
            margin-low = "0.2 bar"
            time-to-relief = "4 h"
            stale = "30 s"

            [notice]
            command = ["ring-bell", "--loud"]
            """);
    assertEquals(List.of("ring-bell", "--loud"), cellar.notice().command());
    assertEquals(1, PortPlans.of(cellar).size());
  }

  @Test
  void theLeastThatIsRequiredIsEnough() {
    Vessel vessel = Cellars.parse(Cellars.LEAST).vessel("FV2").orElseThrow();
    assertEquals(Closure.INFER, vessel.closure());
    assertEquals(ReliefRule.ISO_4126, vessel.limits().relief().orElseThrow().rule());
    assertEquals(101_325, vessel.site().ambientPaAbsolute());
  }

  @Test
  void alarmsAndUnitsAreReadAndTheRestStaysAtItsDefault() {
    Cellar cellar =
        Cellars.parse(
            Cellars.LEAST
                + """
                [alarms]
                margin-low = "0.3 bar"
                time-to-relief = "6 h"
                stale = "45 s"
                [display]
                units = "us"
                """);
    assertEquals(0.3e5, cellar.alarms().marginLowPa(), 1e-6);
    assertEquals(Duration.ofHours(6), cellar.alarms().timeToRelief());
    assertEquals(Duration.ofSeconds(45), cellar.alarms().stale());
    assertEquals(AlarmSettings.DEFAULT.longestShelf(), cellar.alarms().longestShelf());
    assertEquals(Display.US, cellar.alarms().display());
    assertEquals(AlarmSettings.DEFAULT, Cellars.parse(Cellars.LEAST).alarms());
  }

  @Test
  void eachAlarmCanBeSetByItself() {
    Cellar cellar =
        Cellars.parse(
            Cellars.LEAST
                + """
                [alarms]
                liquid-full-within = "3 K"
                deadband = "0.05 bar"
                longest-shelf = "8 h"
                [alarms.each.margin-low]
                on-delay = "30 s"
                [alarms.each.leak]
                switched-off = "the sampling tap drips"
                [notice]
                command = ["ring-bell"]
                from-priority = "warning"
                together = "20 s"
                per-hour = 4
                """);
    AlarmSettings alarms = cellar.alarms();
    assertEquals(3, alarms.liquidFullWithinK(), 1e-9);
    assertEquals(0.05e5, alarms.deadbands().pressurePa(), 1e-6);
    assertEquals(Duration.ofHours(8), alarms.longestShelf());
    assertEquals(AlarmSettings.Delays.seconds(30, 60), alarms.delays(AlarmKind.MARGIN_LOW));
    assertEquals(AlarmSettings.DEFAULT.delays(AlarmKind.VACUUM), alarms.delays(AlarmKind.VACUUM));
    assertEquals(Map.of(AlarmKind.LEAK, "the sampling tap drips"), alarms.manner().switchedOff());
    assertEquals(
        new NoticeRules(Priority.WARNING, Duration.ofSeconds(20), 4), cellar.notice().rules());
    assertEquals(NoticeRules.USUAL, Cellars.parse(Cellars.LEAST).notice().rules());
  }

  @Test
  void anInstrumentOutOfServiceIsCheckedButNotRead() {
    Cellar cellar =
        Cellars.parse(
            Cellars.LEAST.replace(
                "field = \"T\"", "field = \"T\", out-of-service = \"being calibrated\""));
    assertEquals(1, PortPlans.of(cellar).get(0).bindings().size());
    assertEquals(
        List.of(Quality.OUT_OF_SERVICE),
        cellar.instruments().stream()
            .flatMap(instrument -> instrument.outOfService(Instant.EPOCH).stream())
            .map(Fault::quality)
            .toList());
  }

  @Test
  void recordingIsReadAndItsDefaultsStay() {
    Cellar cellar =
        Cellars.parse(
            Cellars.LEAST
                + """
                [recording]
                flush = "2 s"
                keep-days = 90
                keep-megabytes = 500
                delete-oldest-for-room = false
                """);
    assertEquals(Duration.ofSeconds(2), cellar.recording().flush());
    assertEquals(
        new RecorderSettings.Keep(
            90, 500L << 20, RecorderSettings.Keep.USUAL.leastFreeBytes(), false),
        cellar.recording().keep());
    assertEquals(RecorderSettings.USUAL, Cellars.parse(Cellars.LEAST).recording());
  }

  @Test
  void whomToTellIsRead() {
    Cellar cellar =
        Cellars.parse(
            Cellars.LEAST
                + """
                [notice]
                command = ["ring-bell", "--loud"]
                webhook = { url = "http://127.0.0.1:8080/alarm", token-file = "token" }
                mail = { host = "h", from = "a@example.org", to = ["b@example.org"], tls = true }
                """);
    NoticePlan notice = cellar.notice();
    assertEquals(List.of("ring-bell", "--loud"), notice.command());
    assertEquals(8080, notice.webhook().orElseThrow().url().getPort());
    assertEquals(587, notice.mail().orElseThrow().port());
    assertTrue(notice.mail().orElseThrow().tls());
    assertEquals(NoticePlan.NONE, Cellars.parse(Cellars.LEAST).notice());
  }

  @Test
  void aToleranceMayBeNamedByItsStandard() {
    String asme = Cellars.LEAST.replace("\"1.5 bar\" }", "\"1.5 bar\", tolerance = \"ASME\" }");
    Vessel vessel = Cellars.parse(asme).vessel("FV2").orElseThrow();
    assertEquals(ReliefRule.ASME, vessel.limits().relief().orElseThrow().rule());
    assertEquals(2 * 6894.757, vessel.limits().relief().orElseThrow().tolerancePa(), 0.01);
  }

  @Test
  void aBarometerIsReadForEveryVessel() {
    String text =
        Cellars.LEAST
            + "[site]\nbarometer = { device = \"text-line\", port = \"/dev/ttyUSB0\", field = \"B\" }\n";
    Instrument barometer = Cellars.parse(text).instruments().get(2);
    assertEquals(Quantity.BAROMETER, barometer.quantity());
    assertEquals("FV2", barometer.vessel());
  }

  @Test
  void everythingWrongIsToldAtOnceInTheOrderOfTheFile() {
    String text =
        Cellars.LEAST.replace("fill = \"1800 L\"", "fil = \"1800 L\"").replace("beer", "ale");
    BadCellarException fault = assertThrows(BadCellarException.class, () -> Cellars.parse(text));
    assertEquals(3, fault.problems().size(), fault.problems()::toString);
    assertTrue(fault.problems().get(0).startsWith("cellar.toml line 1, vessel.FV2: 'fill' is"));
    assertTrue(fault.problems().get(1).startsWith("cellar.toml line 3, vessel.FV2.fil: there"));
    assertTrue(fault.problems().get(2).startsWith("cellar.toml line 4, vessel.FV2.liquid: 'ale'"));
    assertTrue(fault.getMessage().endsWith("(and 2 more: see tunwarden cellar check)"));
  }

  @Test
  void hostileFilesAreRefusedInOneSentence(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("c.toml");
    for (String text :
        List.of(
            "a = " + "[".repeat(100_000),
            "a = " + "{b = ".repeat(50_000),
            "[" + "a.".repeat(100_000) + "b]",
            "a = \"" + "z".repeat(500_000) + "\"",
            "a = \"\"\"\n\\",
            "\u0000\u0001",
            "a",
            "a.",
            "a = '",
            "[",
            "{",
            "}}}}",
            "x = 1\n".repeat(200_000))) {
      Files.writeString(file, text);
      BadInputException fault =
          assertThrows(BadInputException.class, () -> CellarFile.read(file), text::strip);
      assertEquals(1, fault.getMessage().lines().count());
      assertTrue(fault.getMessage().length() < 400, fault::getMessage);
    }
  }

  @Test
  void bytesThatAreNoTextAreRefused(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("c.toml");
    Files.write(file, new byte[] {'a', '=', '"', (byte) 0xE9, '"'});
    assertEquals(
        file + " is not UTF-8 text; save it as UTF-8",
        assertThrows(BadInputException.class, () -> CellarFile.read(file)).getMessage());
    assertEquals(
        folder + " is a folder; name the cellar file in it",
        assertThrows(BadInputException.class, () -> CellarFile.read(folder)).getMessage());
    Path missing = folder.resolve("none.toml");
    assertEquals(
        "there is no cellar file " + missing + "; make one with: tunwarden cellar new " + missing,
        assertThrows(BadInputException.class, () -> CellarFile.read(missing)).getMessage());
  }

  @Test
  void aByteOrderMarkAndWindowsLineEndsDoNoHarm(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("c.toml");
    Files.writeString(file, "\uFEFF" + Cellars.LEAST.replace("\n", "\r\n"));
    assertEquals(1, CellarFile.read(file).vessels().size());
  }
}

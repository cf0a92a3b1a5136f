package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** One spoiled line, one exact sentence. */
class CellarFaultsTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "volume = \"2000 L\" | volum = \"2000 L\" | line 2, vessel.FV2.volum: there is no such key"
            + " here; did you mean 'volume'?",
        "liquid = \"beer\" | liquid = \"beer\"\\nclosur = \"open\" | line 5, vessel.FV2.closur:"
            + " there is no such key here; did you mean 'closure'?",
        "liquid = \"beer\" | liquid = \"beer\"\\nzzzzzzzzzzzzzz = 1 | line 5,"
            + " vessel.FV2.zzzzzzzzzzzzzz: there is no such key here; known here: readings, title,"
            + " volume, fill, liquid, gas, air, closure, limits, relief-valve, ambient,"
            + " fill-accuracy, time-constant, ferment, target, supply, fire-area",
        "fill = \"1800 L\" | fill = \"2100 L\" | line 3, vessel.FV2.fill: the fill is larger than"
            + " the volume; check both",
        "fill = \"1800 L\" | fill = 1800 | line 3, vessel.FV2.fill: write the number with its unit"
            + " in quotes, not 1800",
        "fill = \"1800 L\" | fill = \"1800\" | line 3, vessel.FV2.fill: '1800' has no unit; for a"
            + " volume use one of m3, L, hL, mL",
        "fill = \"1800 L\" | fill = \"-3 L\" | line 3, vessel.FV2.fill: '-3 L' is negative; write"
            + " zero or more",
        "fill = \"1800 L\" | fill = nan | line 3, vessel.FV2.fill: write the number with its unit"
            + " in quotes, not NaN",
        "fill = \"1800 L\" | fill = true | line 3, vessel.FV2.fill: write a text in quotes, not"
            + " true",
        "volume = \"2000 L\" | volume = \"0 L\" | line 2, vessel.FV2.volume: a vessel has a volume"
            + " above zero",
        "fill = \"1800 L\" | fill = \"1800 L\"\\nfill = \"1700 L\" | line 4, vessel.FV2.fill: this"
            + " key stands on line 3 already; keep one of the two",
        "fill = \"1800 L\" | fill = | line 3: this is not TOML (Newline not permitted here); check"
            + " quotes and brackets",
        "liquid = \"beer\" | liquid = \"bear\" | line 4, vessel.FV2.liquid: 'bear' is not a liquid;"
            + " did you mean 'beer'?",
        "liquid = \"beer\" | liquid = { kind = \"wine\", method = \"chart\" } | line 4,"
            + " vessel.FV2.liquid.method: only beer has a choice of method; leave it out",
        "liquid = \"beer\" | liquid = { kind = \"beer\", abv = \"105 %\" } | line 4,"
            + " vessel.FV2.liquid.abv: '105 %' is more than the whole; write at most 100 %",
        "{ relief = \"1.5 bar\" } | { } | line 5, vessel.FV2.limits: 'relief' is missing; write for"
            + " example relief = \"1.5 bar\"",
        "{ relief = \"1.5 bar\" } | { relief = \"1.5 bar\", vessel = \"1.4 bar\" } | line 5,"
            + " vessel.FV2.limits.relief: the setting is above what the vessel is rated for; check"
            + " both",
        "{ relief = \"1.5 bar\" } | { relief = \"1.5 bar\", tolerance = \"1.6 bar\" } | line 5,"
            + " vessel.FV2.limits.tolerance: it is as wide as the setting; check both",
        "{ relief = \"1.5 bar\" } | { relief = \"1.5 bar\", vacuum = \"0.2 bar\" } | line 5,"
            + " vessel.FV2.limits.vacuum: write zero or a negative gauge pressure",
        "{ relief = \"1.5 bar\" } | { relief = \"0.9 bara\" } | line 5, vessel.FV2.limits.relief:"
            + " write a setting above zero gauge",
        "limits = { relief = \"1.5 bar\" } | limits = \"1.5 bar\" | line 5, vessel.FV2.limits:"
            + " write a table here, as [vessel.FV2.limits] or { … }",
        "[vessel.FV2.readings]\\n | [vessel.FV2.readings]\\nlevell = 1\\n | line 8,"
            + " vessel.FV2.readings.levell: there is no such key here; did you mean 'level'?",
        "field = \"T\" | field = \"T\", address = 248 | line 9,"
            + " vessel.FV2.readings.temperature.address: write a whole number from 1 to 247, not"
            + " 248",
        "field = \"T\" | field = \"T\", every = \"0 s\" | line 9,"
            + " vessel.FV2.readings.temperature.every: '0 s' is no time at all",
        "field = \"T\" | feld = \"T\" | line 9, vessel.FV2.readings.temperature.feld: there is no"
            + " such key here; did you mean 'field'?",
        "{ relief = \"1.5 bar\" } | { relief = \"1.5 bar\", tolerance = \"DIN\" } | line 5,"
            + " vessel.FV2.limits.tolerance: 'DIN' is not a pressure; write a number with one of Pa,"
            + " bar, mbar, kPa, MPa, psi, atm",
        "[vessel.FV2]\\n | [alarms]\\nmargin_low = \"0.2 bar\"\\n[vessel.FV2]\\n | line 2,"
            + " alarms.margin_low: there is no such key here; did you mean 'margin-low'?",
        "[vessel.FV2]\\n | [alarms]\\nstale = \"0 s\"\\n[vessel.FV2]\\n | line 2, alarms.stale:"
            + " '0 s' is no time at all",
        "[vessel.FV2]\\n | [alarms.each.leek]\\n[vessel.FV2]\\n | line 1,"
            + " alarms.each.leek: there is no such key here; did you mean 'leak'?",
        "[vessel.FV2]\\n | [alarms.each.vacuum]\\non-delay = \"2 min\"\\n[vessel.FV2]\\n | line"
            + " 2, alarms.each.vacuum.on-delay: '2 min' is too long; write at most 60 s",
        "[vessel.FV2]\\n | [alarms.each.vacuum]\\nswitched-off = \"no\"\\n[vessel.FV2]\\n | line"
            + " 2, alarms.each.vacuum.switched-off: write why in a few words; an alarm of high"
            + " priority cannot be switched off for good, it can be shelved or taken out of service"
            + " with the alarms command",
        "[vessel.FV2]\\n | [notice]\\nfrom-priority = \"loud\"\\n[vessel.FV2]\\n | line 2,"
            + " notice.from-priority: 'loud' is no priority; write advice, caution, warning or high",
        "[vessel.FV2]\\n | [display]\\nunits = \"imperial\"\\n[vessel.FV2]\\n | line 2,"
            + " display.units: 'imperial' is not a set of units; write one of metric, us, si",
        "[vessel.FV2]\\n | [notice]\\ncommand = \"ring\"\\n[vessel.FV2]\\n | line 2,"
            + " notice.command: write a list of texts in quotes, as [\"one\", \"two\"]",
        "[vessel.FV2]\\n | [notice]\\nwebhook = { url = \"http://example.org\" }\\n[vessel.FV2]\\n"
            + " | line 2, notice.webhook.url: 'http://example.org' will not do; write an https"
            + " address, or http on this machine",
        "[vessel.FV2]\\n | [notice]\\nmail = { host = \"h\", from = \"a@b\", to = [\"a b\"] }\\n"
            + "[vessel.FV2]\\n | line 2, notice.mail.to: 'a b' is not an e-mail address",
        "[vessel.FV2]\\n | [sitte]\\n[vessel.FV2]\\n | line 1, sitte: there is no such key here; did"
            + " you mean 'site'?",
        "[vessel.FV2]\\n | [site]\\naltitude = \"9000 m\"\\n[vessel.FV2]\\n | line 2, site.altitude:"
            + " an altitude of 9000.0 m is outside -500 to 5000 m; give the air pressure",
      })
  void eachFaultIsNamed(String right, String wrong, String sentence) {
    String text = Cellars.LEAST.replace(plain(right), plain(wrong));
    List<String> problems =
        assertThrows(BadCellarException.class, () -> Cellars.parse(text)).problems();
    String told =
        problems.stream()
            .filter(problem -> problem.equals("cellar.toml " + sentence))
            .findFirst()
            .orElse(String.join("\n", problems));
    assertEquals("cellar.toml " + sentence, told);
  }

  @ParameterizedTest
  @CsvSource({"con", "FV 2", "../x", "a.b", "''", "x23456789012345678901234567890123"})
  void aNameThatIsNoFileNameIsRefused(String name) {
    String text = Cellars.LEAST.replace("vessel.FV2", "vessel.\"" + name + "\"");
    String problem =
        assertThrows(BadCellarException.class, () -> Cellars.parse(text)).problems().get(0);
    assertEquals(
        "cellar.toml line 1, vessel."
            + name
            + ": a vessel's name is also a file name: write up to 32 letters, digits, '-' and '_',"
            + " and no device name",
        problem);
  }

  private static String plain(String cell) {
    return cell.strip().replace("\\n", "\n");
  }
}

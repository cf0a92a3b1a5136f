package tunwarden.wire.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.config.profile.ProfileReader;
import tunwarden.config.profile.Profiles;
import tunwarden.reading.Quality;
import tunwarden.wire.signal.Decoded;
import tunwarden.wire.text.LineReader.Verdict;

/** Values out of one line. */
class LineReaderTest {
  private final LineReader pairs = new LineReader(Profiles.find("text-line", Path.of("")));

  private static LineReader framed(String framing, String field) {
    return new LineReader(
        ProfileReader.read(
            "{\"name\":\"n\",\"title\":\"t\",\"speaks\":\"text-lines\",\"framing\":{"
                + framing
                + "},\"fields\":{\"P\":{\"measures\":\"pressure\",\"unit\":\"mbar\",\"accuracy\":"
                + "\"1 mbar\",\"range\":[\"-1 bar\",\"10 bar\"],"
                + field
                + "}}}",
            "n"));
  }

  private static double pressurePa(LineReader reader, String line) {
    Map<String, Decoded> values = reader.read(line, "").values();
    assertEquals(Quality.GOOD, values.get("P").quality(), values::toString);
    return values.get("P").si();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "P=0.873 T=5.25",
        "T=5.25;P=+0.873",
        "junk P=873e-3, T=5.25",
        "P=.873\tX=9",
        "P=0.873 OK",
        "P=0.873bar T=5.25 C",
        "P=0.873 barg"
      })
  void aPairIsReadWhereverItStands(String line) {
    assertEquals(87_300, pressurePa(pairs, line), 1e-6);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "P=",
        "P=0.8.73",
        "P=0x10",
        "P=1e999",
        "P=NaN",
        "P=--1",
        "P=12.6 psi",
        "P=1.9bara"
      })
  void whatIsNoNumberInTheProfilesUnitIsSaidAndNeverGuessed(String line) {
    Decoded decoded = pairs.read(line, "").values().get("P");
    assertTrue(decoded.isBad(), decoded::toString);
    assertTrue(Double.isNaN(decoded.si()));
  }

  @Test
  void aKeyPartedFromItsValueIsNotRead() {
    assertEquals(Verdict.FOREIGN, pairs.read("P = 0.873", "").verdict());
  }

  @Test
  void aValueOutsideTheRangeIsBadAndSaysBoth() {
    Decoded decoded = pairs.read("P=12.5", "").values().get("P");
    assertEquals(Quality.OUT_OF_RANGE, decoded.quality());
    assertEquals(
        "12.5000 bar gauge, the range is -1.0000 bar gauge to 10.0000 bar gauge", decoded.detail());
  }

  @Test
  void columnsAreCountedEvenWhenEmpty() {
    LineReader columns = framed("\"layout\":\"columns\",\"between\":\";\"", "\"column\":3");
    assertEquals(120_000, pressurePa(columns, "a;;1200;x"), 1e-6);
    assertEquals(Verdict.FOREIGN, columns.read("a;1200", "").verdict());
  }

  @Test
  void decimalCommaAndSuffix() {
    LineReader comma =
        framed(
            "\"decimal\":\"comma\",\"joined-by\":\":\",\"between\":\"|\"",
            "\"key\":\"druck\",\"suffix\":\"mbar\"");
    assertEquals(87_350, pressurePa(comma, "druck: 873,5 mbar | temp: 5,2"), 1e-6);
    assertTrue(comma.read("druck: 12,67 psi", "").values().get("P").isBad());
  }

  @Test
  void aLineWithAWrongOrMissingProofIsDamaged() {
    LineReader checked = framed("\"check\":\"xor\",\"start\":\"$\"", "\"key\":\"P\"");
    String good = Checks.prove("$P=873", tunwarden.wire.profile.Framing.Check.XOR);
    assertEquals(87_300, pressurePa(checked, "noise" + good), 1e-6);
    assertEquals(Verdict.DAMAGED, checked.read(good.replace("873", "973"), "").verdict());
    assertEquals(Verdict.DAMAGED, checked.read("$P=873", "").verdict());
    assertEquals(Verdict.FOREIGN, checked.read("P=873*00", "").verdict());
  }
}

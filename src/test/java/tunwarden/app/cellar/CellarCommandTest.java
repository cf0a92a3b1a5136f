package tunwarden.app.cellar;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.app.Ran;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.vessel.Vessel;

class CellarCommandTest {
  @TempDir private Path folder;
  private Path file;

  @BeforeEach
  void nameTheFile() {
    file = folder.resolve("cellar.toml");
  }

  private Ran answering(String... answers) {
    InputStream before = System.in;
    String typed = String.join("\n", answers) + "\n";
    System.setIn(new ByteArrayInputStream(typed.getBytes(StandardCharsets.UTF_8)));
    try {
      return Ran.tunwarden("cellar", "new", file.toString());
    } finally {
      System.setIn(before);
    }
  }

  @Test
  void theExampleIsSoundAndEveryKeyInItIsKnown() throws IOException {
    Files.writeString(file, Ran.tunwarden("cellar", "new", "--example").ok());
    String told = Ran.tunwarden("cellar", "check", file.toString()).ok();
    assertTrue(told.startsWith(file + " is sound."), told);
    assertTrue(told.contains("FV2: 90.0 % full of beer, relief set at 1.50 bar g"), told);
    assertTrue(told.contains("FV2 temperature: text-line on /dev/ttyUSB0, field T"), told);
  }

  @Test
  void answersBecomeACommentedFileThatIsSound() throws IOException {
    answering(
            "120 m",
            "",
            "FV1",
            "a \"dry\" cider",
            "20 hL",
            "1800 L",
            "cider",
            "1.5 bar",
            "",
            "2.0 bar",
            "24 C",
            "",
            "COM3",
            "",
            "",
            "n")
        .ok();
    Cellar cellar = CellarFile.read(file);
    Vessel vessel = cellar.vessel("FV1").orElseThrow();
    assertEquals("a \"dry\" cider", vessel.title());
    assertEquals(2, vessel.volumeM3(), 1e-12);
    assertEquals("COM3", cellar.instruments().get(0).port());
    String text = Files.readString(file);
    assertTrue(text.contains("# closure = \"infer\"  # sealed, supply"), text);
    try (Stream<Path> files = Files.list(folder)) {
      assertEquals(List.of(file), files.toList());
    }
  }

  @Test
  void aWrongAnswerIsToldAndAskedAgain() throws IOException {
    Ran ran =
        answering(
            "120", "120 m", "", "FV1", "", "2000 L", "1800", "1800 L", "beer", "1.5 bar", "", "",
            "", "", "COM3", "", "", "n");
    assertTrue(ran.ok().contains("'120' has no unit; for a length use one of m,"), ran.out());
    assertTrue(ran.out().contains("'1800' has no unit"), ran.out());
    assertEquals(1, CellarFile.read(file).vessels().size());
  }

  @Test
  void answersThatContradictEachOtherAreAskedOnceMore() throws IOException {
    Ran ran =
        answering(
            "", "", //
            "FV1", "", "1000 L", "1800 L", "", "1.5 bar", "", "", "", "", "COM3", "", "", //
            "FV1", "", "2000 L", "1800 L", "", "1.5 bar", "", "", "", "", "COM3", "", "", //
            "y", //
            "FV2", "", "50 L", "48 L", "wine", "3 bar", "0.2 bar", "", "", "", "COM3", "P2", "T2",
            "n");
    assertTrue(ran.ok().contains("the fill is larger than the volume; check both"), ran.out());
    assertEquals(2, CellarFile.read(file).vessels().size());
  }

  @Test
  void anEndOfInputWritesNothing() {
    Ran ran = answering("120 m", "", "FV1");
    assertEquals(2, ran.code());
    assertEquals(
        "the answers ended before the questions did; nothing was written", ran.err().strip());
    assertFalse(Files.exists(file));
  }

  @Test
  void anExistingFileIsNeverTouched() throws IOException {
    Files.writeString(file, "mine");
    assertEquals(
        file + " is there already; name another file, or move it away first",
        Ran.tunwarden("cellar", "new", file.toString()).refused());
    assertEquals("mine", Files.readString(file));
  }

  @Test
  void everyFaultIsALineOfItsOwnAndTheCodeIsTwo() throws IOException {
    Files.writeString(file, "[vessel.A]\nvolum = \"1 m3\"\n");
    Ran ran = Ran.tunwarden("cellar", "check", file.toString());
    assertEquals(2, ran.code());
    assertEquals("", ran.out());
    assertTrue(ran.err().contains(file + " line 2, vessel.A.volum: there is no such key"));
    assertTrue(ran.err().lines().count() >= 4, ran.err());
  }

  @Test
  void anUnknownDeviceAndAnUnknownFieldAreToldToo() throws IOException {
    String example = Ran.tunwarden("cellar", "new", "--example").ok();
    Files.writeString(file, example.replace("field = \"T\"", "field = \"Q\""));
    assertTrue(
        Ran.tunwarden("cellar", "check", file.toString()).refused().contains("has no field 'Q'"));
    Files.writeString(file, example.replace("\"text-line\"", "\"text-lime\""));
    Ran both = Ran.tunwarden("cellar", "check", file.toString());
    assertEquals(2, both.code());
    List<String> told = both.err().lines().toList();
    assertEquals(2, told.size(), both.err());
    List<String> lines = Files.readAllLines(file);
    for (String quantity : List.of("pressure", "temperature")) {
      int line = 1;
      while (!lines.get(line - 1).startsWith(quantity + " =")) {
        line++;
      }
      String begin = " line " + line + ", vessel.";
      assertTrue(
          told.stream()
              .anyMatch(
                  s ->
                      s.contains(begin)
                          && s.contains(".readings." + quantity + ": ")
                          && s.contains("there is no device profile 'text-lime'")),
          begin + " in " + both.err());
    }
  }

  @Test
  void withoutASubcommandItSaysWhatThereIs() {
    assertTrue(Ran.tunwarden("cellar").refused().startsWith("Say what to do: cellar new or"));
  }
}

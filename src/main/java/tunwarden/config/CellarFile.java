package tunwarden.config;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.dataformat.toml.TomlFactory;
import com.fasterxml.jackson.dataformat.toml.TomlMapper;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import tunwarden.units.BadInputException;

/** Reads a cellar file: bytes to text, text to a tree, the tree to records. */
public final class CellarFile {
  /** The name looked for in the working directory. */
  public static final String USUAL_NAME = "cellar.toml";

  private static final int MOST_BYTES = 1 << 20;
  private static final int MOST_DEPTH = 20;
  private static final int LONGEST_TEXT = 10_000;

  private CellarFile() {}

  /**
   * Reads and checks a cellar file.
   *
   * @throws BadCellarException naming line and key of everything wrong in it
   * @throws BadInputException when the file is not there, too large or not text
   * @throws IOException when it cannot be read
   */
  public static Cellar read(Path file) throws IOException {
    return parse(file, text(file));
  }

  /**
   * Checks a cellar text.
   *
   * @param file the name the problems are told with
   * @throws BadCellarException naming line and key of everything wrong in it
   */
  public static Cellar parse(Path file, String text) {
    LineIndex lines = LineIndex.of(text);
    JsonNode tree = tree(file.toString(), text, lines);
    Problems problems = new Problems(file.toString(), lines);
    Cellar cellar = new CellarReader(new Section(tree, List.of(), problems), problems).read(file);
    problems.throwIfAny();
    return cellar;
  }

  private static String text(Path file) throws IOException {
    byte[] bytes;
    try {
      if (Files.isDirectory(file)) {
        throw new BadInputException(file + " is a folder; name the cellar file in it");
      }
      // The size is asked of the bytes read, not of the file, which may be a pipe.
      try (var in = Files.newInputStream(file)) {
        bytes = in.readNBytes(MOST_BYTES + 1);
      }
    } catch (NoSuchFileException missing) {
      throw new BadInputException(
          "there is no cellar file " + file + "; make one with: tunwarden cellar new " + file,
          missing);
    }
    if (bytes.length > MOST_BYTES) {
      throw new BadInputException(file + " is larger than 1 MiB, which no cellar file needs");
    }
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return text.startsWith("\uFEFF") ? text.substring(1) : text;
    } catch (CharacterCodingException fault) {
      throw new BadInputException(file + " is not UTF-8 text; save it as UTF-8", fault);
    }
  }

  private static JsonNode tree(String file, String text, LineIndex lines) {
    TomlFactory factory =
        TomlFactory.builder()
            .streamReadConstraints(
                StreamReadConstraints.builder()
                    .maxNestingDepth(MOST_DEPTH)
                    .maxStringLength(LONGEST_TEXT)
                    .maxDocumentLength(MOST_BYTES)
                    .build())
            .build();
    try {
      return new TomlMapper(factory).readTree(text);
    } catch (StreamConstraintsException fault) {
      throw new BadInputException(
          file
              + " holds tables inside tables more than "
              + MOST_DEPTH
              + " deep or a text of more than "
              + LONGEST_TEXT
              + " letters, which no cellar file needs",
          fault);
    } catch (JsonProcessingException fault) {
      throw new BadCellarException(List.of(syntax(file, fault, lines)));
    }
  }

  private static String syntax(String file, JsonProcessingException fault, LineIndex lines) {
    String words = fault.getOriginalMessage();
    if (words.equals("Duplicate key") && lines.duplicate().isPresent()) {
      List<String> key = lines.duplicate().get();
      return file
          + " line "
          + lines.duplicateLine()
          + ", "
          + String.join(".", key)
          + ": this key stands on line "
          + lines.lineOf(key)
          + " already; keep one of the two";
    }
    JsonLocation where = fault.getLocation();
    String line = where == null ? "" : " line " + where.getLineNr();
    return file + line + ": this is not TOML (" + words + "); check quotes and brackets";
  }
}

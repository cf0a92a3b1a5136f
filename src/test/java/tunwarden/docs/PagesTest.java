package tunwarden.docs;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import tunwarden.app.Main;
import tunwarden.app.Ran;

/**
 * Every command in a console block of a page: with output shown it is run and its output compared,
 * up to a line of three dots; without, its options are held against the real parser, since many
 * such commands wait for a person or an instrument.
 */
class PagesTest {
  private static final Path PAGES = Path.of("src/site/markdown");
  private static final Pattern BLOCK = Pattern.compile("(?s)```console\\n(.*?)```");
  private static final Pattern LINK = Pattern.compile("\\]\\(([^)#:]+\\.md)(?:#[^)]*)?\\)");

  private static List<Path> pages() throws IOException {
    try (Stream<Path> files = Files.list(PAGES)) {
      return files.filter(file -> file.toString().endsWith(".md")).sorted().toList();
    }
  }

  @TestFactory
  List<DynamicTest> everyCommandShownIsTrue() throws IOException {
    List<DynamicTest> tests = new ArrayList<>();
    for (Path page : pages()) {
      Matcher block = BLOCK.matcher(Files.readString(page));
      while (block.find()) {
        for (String part : block.group(1).split("(?m)^\\$ tunwarden")) {
          if (!part.isBlank()) {
            int end = part.indexOf('\n');
            String command = part.substring(0, end).strip();
            String shown = part.substring(end + 1);
            tests.add(
                DynamicTest.dynamicTest(
                    page.getFileName() + ": " + command, () -> check(command, shown)));
          }
        }
      }
    }
    return tests;
  }

  private static void check(String command, String shown) {
    String[] args = command.isEmpty() ? new String[0] : command.replace("'", "").split("\\s+");
    if (shown.isBlank()) {
      assertDoesNotThrow(() -> Main.commandLine().parseArgs(args));
      return;
    }
    String printed = Ran.tunwarden(args).ok().replace(System.lineSeparator(), "\n");
    int dots = shown.indexOf("...\n");
    if (dots < 0) {
      assertEquals(shown, printed);
    } else {
      assertEquals(
          shown.substring(0, dots), printed.substring(0, Math.min(dots, printed.length())));
    }
  }

  @Test
  void everyLinkBetweenPagesLeadsSomewhere() throws IOException {
    for (Path page : pages()) {
      Matcher link = LINK.matcher(Files.readString(page));
      while (link.find()) {
        Path target = page.resolveSibling(link.group(1));
        assertTrue(Files.exists(target), page + " links to " + link.group(1));
      }
    }
  }
}

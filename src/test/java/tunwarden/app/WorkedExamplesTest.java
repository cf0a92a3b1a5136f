package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import picocli.CommandLine;
import tunwarden.app.options.WorkedExamples;

/** Runs every example of every help page and holds what it prints to what the page shows. */
class WorkedExamplesTest {
  private record Example(String command, String prints) {}

  @TestFactory
  Stream<DynamicTest> everyExampleDoesWhatTheHelpShows() {
    return leaves(Main.commandLine()).stream()
        .flatMap(line -> examples(WorkedExamples.of(nameOf(line)).orElse("")).stream())
        .map(example -> DynamicTest.dynamicTest(example.command, () -> run(example)));
  }

  @Test
  void everyCommandHasExamplesInItsHelp() {
    for (CommandLine line : leaves(Main.commandLine())) {
      String help = line.getUsageMessage();
      assertTrue(help.contains("Example") && help.contains("tunwarden "), nameOf(line));
      assertEquals(1, help.split("Examples?:\\R").length - 1, nameOf(line));
      assertTrue(help.lines().allMatch(WorkedExamplesTest::fits), nameOf(line));
    }
  }

  @Test
  void everyKindOfAnswerHasTwoWorkedExamples() {
    CommandLine reckon = Main.commandLine().getSubcommands().get("reckon");
    for (CommandLine kind : reckon.getSubcommands().values()) {
      assertEquals(2, examples(WorkedExamples.of(nameOf(kind)).orElse("")).size(), nameOf(kind));
    }
  }

  /** A text in JSON may be as long as it is. */
  private static boolean fits(String line) {
    return line.length() <= 90 || line.strip().startsWith("\"");
  }

  private static void run(Example example) {
    String[] words = example.command.replace("'", "").split("\\s+");
    String[] args = List.of(words).subList(1, words.length).toArray(String[]::new);
    assertEquals(example.prints, Ran.tunwarden(args).ok().replace(System.lineSeparator(), "\n"));
  }

  private static List<Example> examples(String page) {
    List<Example> found = new ArrayList<>();
    for (String part : page.split("(?m)^\\$ ")) {
      if (!part.isBlank()) {
        String joined = part.replace("\\\n", " ");
        int end = joined.indexOf('\n');
        found.add(new Example(joined.substring(0, end), joined.substring(end + 1).strip() + "\n"));
      }
    }
    return found;
  }

  private static String nameOf(CommandLine line) {
    return line.getCommandSpec().qualifiedName();
  }

  private static List<CommandLine> leaves(CommandLine line) {
    return line.getSubcommands().isEmpty()
        ? List.of(line)
        : line.getSubcommands().values().stream().flatMap(sub -> leaves(sub).stream()).toList();
  }
}

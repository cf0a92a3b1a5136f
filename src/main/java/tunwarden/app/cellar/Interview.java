package tunwarden.app.cellar;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tunwarden.config.BadCellarException;
import tunwarden.config.CellarFile;
import tunwarden.config.CellarTemplate;
import tunwarden.units.BadInputException;

/** Asks for a cellar, question by question; a wrong answer is told and asked again. */
final class Interview {
  private final BufferedReader in;
  private final PrintWriter out;
  private final Path file;

  Interview(BufferedReader in, PrintWriter out, Path file) {
    this.in = in;
    this.out = out;
    this.file = file;
  }

  /**
   * The text of the file.
   *
   * @throws BadInputException when the answers end before the questions do
   */
  String ask() throws IOException {
    out.println(
        "Quantities are written with their unit. An empty answer takes what is in brackets,");
    out.println("or leaves the line out.");
    Map<String, String> common = answers(Question.aboutTheSite());
    List<Map<String, String>> vessels = new ArrayList<>();
    do {
      vessels.add(vessel(common, vessels));
    } while (yes("Another vessel? y or n [n]: "));
    return CellarTemplate.fill(common, vessels);
  }

  /** Asks about one vessel until its answers fit each other and the vessels before it. */
  private Map<String, String> vessel(Map<String, String> common, List<Map<String, String>> before)
      throws IOException {
    while (true) {
      out.println();
      Map<String, String> answers = answers(Question.aboutAVessel());
      List<Map<String, String>> all = new ArrayList<>(before);
      all.add(answers);
      try {
        CellarFile.parse(file, CellarTemplate.fill(common, all));
        return answers;
      } catch (BadCellarException wrong) {
        out.println("That cannot be:");
        wrong.problems().forEach(out::println);
        out.println("Once more, please.");
      }
    }
  }

  private Map<String, String> answers(Question[] questions) throws IOException {
    Map<String, String> answers = new HashMap<>();
    for (Question question : questions) {
      String answer = answer(question);
      if (answer != null) {
        answers.put(question.place(), answer);
      }
    }
    return answers;
  }

  private String answer(Question question) throws IOException {
    String usual = question.usual();
    String bracket = usual == null ? " [leave out]" : usual.isEmpty() ? "" : " [" + usual + "]";
    while (true) {
      String line = line(question.words() + bracket + ": ");
      String answer = line.isEmpty() ? usual : line;
      if (answer == null) {
        return null;
      }
      try {
        if (!answer.isEmpty()) {
          question.check().apply(answer);
          return answer;
        }
        out.println("This one is needed.");
      } catch (BadInputException wrong) {
        out.println(wrong.getMessage());
      }
    }
  }

  private boolean yes(String words) throws IOException {
    return line(words).startsWith("y");
  }

  private String line(String words) throws IOException {
    out.print(words);
    out.flush();
    String line = in.readLine();
    if (line == null) {
      out.println();
      throw new BadInputException(
          "the answers ended before the questions did; nothing was written");
    }
    return line.strip();
  }
}

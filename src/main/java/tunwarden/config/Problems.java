package tunwarden.config;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Collects what is wrong with one file, each with the line and the key it stands at. */
final class Problems {
  private record Problem(int line, String sentence) {}

  private final String file;
  private final LineIndex lines;
  private final List<Problem> found = new ArrayList<>();

  Problems(String file, LineIndex lines) {
    this.file = file;
    this.lines = lines;
  }

  /** Records a problem with what stands at a path of keys, or with what should stand there. */
  void add(List<String> path, String sentence) {
    int line = lines.lineOf(path);
    String key = path.isEmpty() ? "" : ", " + String.join(".", path);
    String words = file + " line " + line + key + ": " + sentence;
    // What is quoted from the file may hold what a terminal obeys.
    found.add(new Problem(line, words.replaceAll("\\p{Cntrl}", "?")));
  }

  int count() {
    return found.size();
  }

  /**
   * Ends the reading if anything was wrong.
   *
   * @throws BadCellarException with every problem, in the order of the file
   */
  void throwIfAny() {
    if (!found.isEmpty()) {
      found.sort(Comparator.comparingInt(Problem::line));
      throw new BadCellarException(found.stream().map(Problem::sentence).toList());
    }
  }
}

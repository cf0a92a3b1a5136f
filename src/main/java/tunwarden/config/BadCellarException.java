package tunwarden.config;

import java.util.List;
import tunwarden.units.BadInputException;

/** A cellar file that cannot be used; each problem is a sentence of its own. */
public final class BadCellarException extends BadInputException {
  private static final long serialVersionUID = 1;

  private final List<String> problems;

  BadCellarException(List<String> problems) {
    super(summary(problems));
    this.problems = List.copyOf(problems);
  }

  /** Every problem found, in the order of the file. */
  public List<String> problems() {
    return problems;
  }

  private static String summary(List<String> problems) {
    String first = problems.get(0);
    return problems.size() == 1
        ? first
        : first + " (and " + (problems.size() - 1) + " more: see tunwarden cellar check)";
  }
}

package tunwarden.physics.answer;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One number with everything a person needs to judge it.
 *
 * @param value SI; empty when there is no answer, and then the remarks say why
 * @param u95 expanded uncertainty, 95 %, in the unit of the value; zero without a value
 * @param model the correlations used, in words
 * @param remarks one sentence for each thing that limits the answer: a correlation used outside its
 *     range, an input that is no number
 */
public record Answer(OptionalDouble value, double u95, String model, List<String> remarks) {
  /** Keeps its own copy of the remarks; a value that is no number becomes no answer. */
  public Answer {
    if (value.isPresent() && !Double.isFinite(value.getAsDouble())) {
      value = OptionalDouble.empty();
    }
    u95 = value.isPresent() && Double.isFinite(u95) ? u95 : 0;
    remarks = List.copyOf(remarks);
  }

  /** No answer, for a reason. */
  public static Answer none(String model, String reason) {
    return new Answer(OptionalDouble.empty(), 0, model, List.of(reason));
  }

  /** The same answer with other remarks. */
  Answer with(List<String> other) {
    return new Answer(value, u95, model, other);
  }
}

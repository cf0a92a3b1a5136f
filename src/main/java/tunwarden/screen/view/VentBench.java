package tunwarden.screen.view;

import java.util.Optional;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.vent.Vent;
import tunwarden.forecast.vent.VentAnswer;
import tunwarden.forecast.vent.VentQuestion;
import tunwarden.vessel.Vessel;

/**
 * Answers the bench's question and remembers the last answer, since a screen is drawn more often
 * than the question or the estimate changes. The memory changes no answer.
 */
final class VentBench {
  private static Key lastKey;
  private static Outcome lastOutcome;
  private static Ensemble lastEnsemble;

  private VentBench() {}

  /**
   * What came of a question.
   *
   * @param answer the answer, if the question could be answered
   * @param fault why not, one sentence; empty with an answer
   */
  record Outcome(Optional<VentAnswer> answer, String fault) {}

  private record Key(Vessel vessel, Estimate estimate, VentQuestion question) {
    boolean isOfSame(Key other) {
      return other != null && vessel == other.vessel && estimate == other.estimate;
    }
  }

  static synchronized Outcome of(Vessel vessel, Estimate estimate, VentQuestion question) {
    Key key = new Key(vessel, estimate, question);
    if (key.isOfSame(lastKey) && question.equals(lastKey.question())) {
      return lastOutcome;
    }
    Ensemble ensemble =
        key.isOfSame(lastKey) && lastEnsemble != null
            ? lastEnsemble
            : Ensemble.of(Present.of(vessel, estimate));
    lastEnsemble = ensemble;
    lastKey = key;
    lastOutcome = answer(ensemble, question);
    return lastOutcome;
  }

  private static Outcome answer(Ensemble ensemble, VentQuestion question) {
    Optional<String> fault = question.fault(ensemble.present());
    return fault
        .map(sentence -> new Outcome(Optional.empty(), sentence))
        .orElseGet(() -> new Outcome(Optional.of(Vent.of(ensemble, question)), ""));
  }
}

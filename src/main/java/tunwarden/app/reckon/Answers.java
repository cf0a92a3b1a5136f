package tunwarden.app.reckon;

import tunwarden.physics.answer.Answer;
import tunwarden.units.BadInputException;

/** From the answers of physics to the sheet. */
final class Answers {
  private Answers() {}

  /**
   * The value; what limits it becomes a caution.
   *
   * @throws BadInputException with the reason when there is none
   */
  static double value(AnswerSheet sheet, Answer answer) {
    if (answer.value().isEmpty()) {
      throw new BadInputException(String.join("; ", answer.remarks()));
    }
    answer.remarks().forEach(sheet::caution);
    return answer.value().getAsDouble();
  }
}

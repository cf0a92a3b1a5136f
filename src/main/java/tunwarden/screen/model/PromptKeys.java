package tunwarden.screen.model;

/** Typing an answer. */
final class PromptKeys {
  private PromptKeys() {}

  static Turn press(Model model, Prompt prompt, Key key) {
    if (key.is(Key.Kind.ESCAPE)) {
      return Turn.to(model.edit().answered().done());
    }
    if (prompt.purpose().isYesOrNo()) {
      return yesOrNo(model, prompt, key);
    }
    String text = prompt.text();
    return switch (key.kind()) {
      case ENTER -> Answers.take(model, prompt);
      case BACKSPACE ->
          edit(model, prompt, text.substring(0, text.isEmpty() ? 0 : lastStart(text)));
      case TYPED -> edit(model, prompt, appended(text, key.character()));
      default -> Turn.to(model);
    };
  }

  private static int lastStart(String text) {
    return text.offsetByCodePoints(text.length(), -1);
  }

  private static String appended(String text, int character) {
    boolean fits = text.length() < Prompt.MOST_TYPED && !Character.isISOControl(character);
    return fits && Character.isValidCodePoint(character)
        ? text + Character.toString(character)
        : text;
  }

  private static Turn edit(Model model, Prompt prompt, String text) {
    return Turn.to(model.edit().ask(prompt.typing(text)).done());
  }

  private static Turn yesOrNo(Model model, Prompt prompt, Key key) {
    if (key.types('y') || key.types('Y')) {
      return Answers.yes(model, prompt);
    }
    boolean no = key.types('n') || key.types('N') || key.is(Key.Kind.ENTER);
    return Turn.to(no ? model.edit().answered().done() : model);
  }
}

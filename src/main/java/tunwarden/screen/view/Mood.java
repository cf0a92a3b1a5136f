package tunwarden.screen.view;

import tunwarden.alarm.Priority;

/** Whether a person must look. Each mood has a sign, so that colour is never alone. */
enum Mood {
  CALM("", Role.NORMAL, Role.STRONG, Role.BAR),
  CAUTION("!", Role.CAUTION, Role.CAUTION, Role.CAUTION_BAR),
  DANGER("!!", Role.DANGER, Role.DANGER, Role.DANGER_BAR);

  private final String sign;
  private final Role role;
  private final Role value;
  private final Role bar;

  Mood(String sign, Role role, Role value, Role bar) {
    this.sign = sign;
    this.role = role;
    this.value = value;
    this.bar = bar;
  }

  String sign() {
    return sign;
  }

  /** For words. */
  Role role() {
    return role;
  }

  /** For the numbers themselves. */
  Role value() {
    return value;
  }

  /** For a whole line. */
  Role bar() {
    return bar;
  }

  static Mood of(Priority priority) {
    return switch (priority) {
      case ADVICE -> CALM;
      case CAUTION, WARNING -> CAUTION;
      case HIGH -> DANGER;
    };
  }

  Mood worse(Mood other) {
    return compareTo(other) >= 0 ? this : other;
  }
}

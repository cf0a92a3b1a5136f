package tunwarden.reading;

/** How far a reading is to be believed, and why. Bad readings never reach the estimator. */
public enum Quality {
  GOOD(Level.GOOD, "good"),
  OUT_OF_RANGE(Level.BAD, "outside the instrument's range"),
  TOO_FAST(Level.SUSPECT, "changes faster than the vessel can"),
  STUCK(Level.SUSPECT, "has not moved for longer than noise allows"),
  LOOP_FAULT(Level.BAD, "the current loop signals a fault"),
  CHECKSUM(Level.BAD, "the message failed its checksum"),
  UNREADABLE(Level.BAD, "the message could not be read"),
  NOT_FINITE(Level.BAD, "is not a number"),
  DISAGREES(Level.SUSPECT, "two sensors of this quantity disagree"),
  STALE(Level.BAD, "nothing new has arrived in time"),
  NO_ANSWER(Level.BAD, "the instrument does not answer"),
  PORT_GONE(Level.BAD, "the serial port is gone"),
  OUT_OF_ORDER(Level.BAD, "is older than the reading before it"),
  OUT_OF_SERVICE(Level.BAD, "the instrument is out of service");

  /** The three grades an operator sees. */
  public enum Level {
    GOOD,
    SUSPECT,
    BAD
  }

  private final Level level;
  private final String why;

  Quality(Level level, String why) {
    this.level = level;
    this.why = why;
  }

  public Level level() {
    return level;
  }

  /** The reason as words that follow the name of the quantity. */
  public String why() {
    return why;
  }

  public boolean isBad() {
    return level == Level.BAD;
  }
}

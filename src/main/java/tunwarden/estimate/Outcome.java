package tunwarden.estimate;

/** What became of one sample. Rejection is an ordinary, explained result. */
public enum Outcome {
  /** Used. */
  ACCEPTED,
  /** Kept until its partner (pressure or temperature) arrives. */
  WAITING,
  /** Not used, for the reason given. */
  REJECTED,
  /** Nothing arrived; the state was carried forward in time. */
  AGED,
  /** The model could not digest it; the previous state stands. */
  MODEL_FAILED
}

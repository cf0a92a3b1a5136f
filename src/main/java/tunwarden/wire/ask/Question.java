package tunwarden.wire.ask;

/** Something to ask an instrument. */
public interface Question {
  /** What is sent. */
  byte[] bytes();

  /** The length of the answer, bytes; an estimate where it is not fixed. */
  int answerBytes();

  /** A fresh ear for the answer to this question, asked once. */
  Ear listen();

  /** Takes in what arrives after a question. Holds a bounded number of bytes; never throws. */
  interface Ear {
    /**
     * Takes bytes in.
     *
     * @return the result, or null while it is not complete
     */
    Result accept(byte[] bytes, int count);

    /** What came of it when the time for an answer is over. */
    Result.Failure late();
  }
}

package tunwarden.estimate;

/** Where callers get their estimator from. */
public final class Estimators {
  private Estimators() {}

  /** The estimator the program uses; stateless and safe to share. */
  public static Estimator standard() {
    return new BankEstimator();
  }

  /**
   * The same without words on what the readings cannot tell, which take as long to work out as all
   * the rest; for those who show none.
   */
  public static Estimator wordless() {
    return new BankEstimator(Watch.WORDLESS);
  }

  /** The plain equilibrium reading, as a yardstick. */
  public static Estimator plain() {
    return new PlainEstimator();
  }
}

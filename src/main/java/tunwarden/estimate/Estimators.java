package tunwarden.estimate;

/** Where callers get their estimator from. */
public final class Estimators {
  private Estimators() {}

  /** The estimator the program uses; stateless and safe to share. */
  public static Estimator standard() {
    return new BankEstimator();
  }

  /** The plain equilibrium reading, as a yardstick. */
  public static Estimator plain() {
    return new PlainEstimator();
  }
}

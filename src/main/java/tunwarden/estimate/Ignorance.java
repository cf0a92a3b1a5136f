package tunwarden.estimate;

import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.bank.Noise;

/** Says what the readings cannot tell at present. */
final class Ignorance {
  static final double EVERY_S = 600;

  private Ignorance() {}

  static String words(Medium medium, Bank bank, Noise noise) {
    return "";
  }
}

package tunwarden.estimate;

/**
 * Memory of the slow watches; immutable. Times in seconds since the epoch.
 *
 * @param coolestK lowest temperature of late, K; creeps up so that a day later it is forgotten
 * @param coolestS when it was seen
 * @param warmestK highest temperature since then
 * @param warmestS when it was seen
 * @param strainS how long nothing has explained the pressure, s
 * @param lossS how long a leak has been the best explanation, s
 * @param lostKgPerM3 what leaked meanwhile, kg per m3 of liquid
 * @param saidS when the words about ignorance were last computed; NaN where nobody wants them
 * @param said those words
 */
record Watch(
    double coolestK,
    double coolestS,
    double warmestK,
    double warmestS,
    double strainS,
    double lossS,
    double lostKgPerM3,
    double saidS,
    String said) {
  static final Watch NEW = new Watch(Double.NaN, 0, Double.NaN, 0, 0, 0, 0, 0, "");

  /** The same, for which it is never time for words. */
  static final Watch WORDLESS = NEW.saying(Double.NaN, "");

  Watch withTemperature(double lowK, double lowS, double highK, double highS) {
    return new Watch(lowK, lowS, highK, highS, strainS, lossS, lostKgPerM3, saidS, said);
  }

  Watch withStrain(double seconds) {
    return new Watch(
        coolestK, coolestS, warmestK, warmestS, seconds, lossS, lostKgPerM3, saidS, said);
  }

  Watch withLoss(double seconds, double lost) {
    return new Watch(coolestK, coolestS, warmestK, warmestS, strainS, seconds, lost, saidS, said);
  }

  Watch saying(double atS, String words) {
    return new Watch(
        coolestK, coolestS, warmestK, warmestS, strainS, lossS, lostKgPerM3, atS, words);
  }
}

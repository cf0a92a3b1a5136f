package tunwarden.forecast.room;

import java.util.List;

/**
 * A limit on breathing CO2 that is in force, or current, at the date its source was read.
 *
 * @param body who sets it
 * @param name its name there
 * @param ppm mole fraction × 10⁶
 * @param averaging over what time
 * @param source where it was read, with its date as far as known
 */
public record ExposureLimit(String body, String name, double ppm, String averaging, String source) {
  /** Least oxygen for entry, mole fraction: OSHA 29 CFR 1910.146, 30 CFR 75.321. */
  public static final double LEAST_OXYGEN = 0.195;

  /** Immediately dangerous to life or health. */
  public static final ExposureLimit NIOSH_IDLH =
      new ExposureLimit(
          "NIOSH",
          "IDLH",
          40_000,
          "any time",
          "NIOSH, as restated publicly; 50,000 before 1994 (date from memory)");

  private static final String NIOSH_PAGE = "NIOSH IDLH page 124389, 1994 (date from memory)";

  /**
   * The limits in force, lowest first within each averaging time. The 10,000 and 30,000 ppm values
   * that OSHA issued in 1989 were vacated and are left out.
   */
  public static final List<ExposureLimit> IN_FORCE =
      List.of(
          new ExposureLimit("OSHA", "PEL", 5_000, "8 h", NIOSH_PAGE),
          new ExposureLimit("NIOSH", "REL", 5_000, "10 h", NIOSH_PAGE),
          new ExposureLimit(
              "ACGIH", "TLV-TWA", 5_000, "8 h", "list of 1993-94 on NIOSH page 124389"),
          new ExposureLimit("UK HSE EH40", "WEL", 5_000, "8 h", "EH40, as restated publicly"),
          new ExposureLimit(
              "EU", "IOELV", 5_000, "8 h", "Directive 2006/15/EC, number from memory"),
          new ExposureLimit("US MSHA", "TWA", 5_000, "shift", "30 CFR 75.321"),
          new ExposureLimit(
              "UK HSE EH40", "WEL short term", 15_000, "15 min", "EH40, as restated publicly"),
          new ExposureLimit("NIOSH", "STEL", 30_000, "15 min", NIOSH_PAGE),
          new ExposureLimit(
              "ACGIH", "TLV-STEL", 30_000, "15 min", "list of 1993-94 on NIOSH page 124389"),
          new ExposureLimit("US MSHA", "STEL", 30_000, "short term", "30 CFR 75.321"),
          NIOSH_IDLH);

  /** The lowest limit averaged over a working day, ppm. */
  public static final double DAY_PPM = 5_000;

  /** The lowest limit averaged over a quarter of an hour, ppm. */
  public static final double SHORT_PPM = 15_000;

  /** Whether that many ppm are above this limit. */
  public boolean isExceededBy(double otherPpm) {
    return otherPpm > ppm;
  }
}

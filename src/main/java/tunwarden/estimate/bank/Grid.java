package tunwarden.estimate.bank;

/**
 * The assumptions of the bank: transfer coefficient by 0.6 of a decade, air left behind in four
 * classes, and five ways the headspace can be connected.
 */
public final class Grid {
  /** Sealed, nothing made, nothing lost. */
  public static final int STILL = 0;

  /** Pressure pinned from outside. */
  public static final int HELD = 1;

  /** Sealed, with gas being made in the liquid. */
  public static final int MAKING = 2;

  /** Closed, but losing gas from the headspace. */
  public static final int LEAKING = 3;

  /** Sealed since a moment ago, after pressure was held: the liquid may hold anything. */
  public static final int CLOSED = 4;

  /** How many ways of connection. */
  public static final int MODES = 5;

  static final int TRANSFERS = 7;

  /** Spread of ln kLa within a class; neighbouring classes overlap at one spread. */
  static final double TRANSFER_LN_SD = 0.7;

  static final int AIRS = 4;
  static final int FILTERS = TRANSFERS * AIRS * MODES;
  private static final double[] TRANSFER_PER_S = new double[TRANSFERS];
  private static final double[] AIR_PA = {0, 15_000, 45_000, 85_000};
  private static final double[] AIR_SD_PA = {1_500, 7_000, 13_000, 17_000};

  static {
    for (int i = 0; i < TRANSFERS; i++) {
      TRANSFER_PER_S[i] = Math.pow(10, -6.6 + i * 0.6);
    }
  }

  private Grid() {}

  static int filter(int transfer, int air, int mode) {
    return (transfer * AIRS + air) * MODES + mode;
  }

  static int transferOf(int filter) {
    return filter / (AIRS * MODES);
  }

  static int airOf(int filter) {
    return filter / MODES % AIRS;
  }

  /** Which of the ways of connection a filter assumes. */
  public static int modeOf(int filter) {
    return filter % MODES;
  }

  /** The transfer coefficient a filter assumes, 1/s. */
  public static double transferPerS(int filter) {
    return TRANSFER_PER_S[transferOf(filter)];
  }

  /** Centre of an air class, Pa; the first is the amount the user stated. */
  static double airPa(int air, double statedPa) {
    return air == 0 ? statedPa : AIR_PA[air];
  }

  static double airSdPa(int air, double statedPa) {
    return AIR_SD_PA[air] + (air == 0 ? 0.15 * statedPa : 0);
  }
}

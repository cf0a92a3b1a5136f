package tunwarden.physics.gas;

/** How the dry pressure of a headspace is shared: left-over air first, purge gas for the rest. */
public final class HeadspaceShares {
  private HeadspaceShares() {}

  /**
   * Partial pressure of one gas, Pa.
   *
   * @param which which gas
   * @param purge what the headspace was purged or is supplied with
   * @param dryPa total pressure less the vapour, Pa; below zero counts as nothing
   * @param airPa left-over air, Pa; held between nothing and all of the dry pressure
   */
  public static double partialPa(Gas which, GasMix purge, double dryPa, double airPa) {
    double dry = Math.max(0, dryPa);
    double air = Math.max(0, Math.min(dry, airPa));
    return (dry - air) * purge.fraction(which) + air * GasMix.AIR.fraction(which);
  }
}

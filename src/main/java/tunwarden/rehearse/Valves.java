package tunwarden.rehearse;

import java.util.Optional;

/** What is open, connected or alive on a simulated vessel at the moment. */
public final class Valves {
  private double ventAreaM2;
  private double supplyPaGauge = Double.NEGATIVE_INFINITY;
  private double spundingPaGauge = Double.POSITIVE_INFINITY;
  private double leakKgPerS;
  private double madeKgPerM3PerS;
  private Optional<Relief> relief = Optional.empty();

  /**
   * A relief valve as it truly behaves.
   *
   * @param opensPaGauge pressure at which this very valve opens, Pa gauge
   * @param reseatsPaGauge pressure at which it shuts again, Pa gauge
   * @param areaM2 effective flow area, m²
   */
  public record Relief(double opensPaGauge, double reseatsPaGauge, double areaM2) {
    /** Whether it is open at a pressure, given whether it was. */
    boolean isOpen(double paGauge, boolean wasOpen) {
      return paGauge >= (wasOpen ? reseatsPaGauge : opensPaGauge);
    }
  }

  /** Opens a vent of that effective area, m²; 0 shuts it. */
  public Valves vent(double areaM2) {
    ventAreaM2 = areaM2;
    return this;
  }

  /** Connects a supply regulated to a pressure, Pa gauge. */
  public Valves supply(double paGauge) {
    supplyPaGauge = paGauge;
    return this;
  }

  /** Shuts the supply. */
  public Valves noSupply() {
    return supply(Double.NEGATIVE_INFINITY);
  }

  /** Fits a back-pressure device that lets surplus out above a pressure, Pa gauge. */
  public Valves spunding(double paGauge) {
    spundingPaGauge = paGauge;
    return this;
  }

  /** Shuts the back-pressure device off. */
  public Valves noSpunding() {
    return spunding(Double.POSITIVE_INFINITY);
  }

  /** A leak that loses this much at 1 bar gauge, kg/s. */
  public Valves leak(double kgPerS) {
    leakKgPerS = kgPerS;
    return this;
  }

  /** Gas made by fermentation, kg per m³ of liquid and second. */
  public Valves making(double kgPerM3PerS) {
    madeKgPerM3PerS = kgPerM3PerS;
    return this;
  }

  /** Fits a relief valve. */
  public Valves relief(Relief fitted) {
    relief = Optional.of(fitted);
    return this;
  }

  double ventAreaM2() {
    return ventAreaM2;
  }

  double supplyPaGauge() {
    return supplyPaGauge;
  }

  double spundingPaGauge() {
    return spundingPaGauge;
  }

  double leakKgPerS() {
    return leakKgPerS;
  }

  double madeKgPerM3PerS() {
    return madeKgPerM3PerS;
  }

  Optional<Relief> relief() {
    return relief;
  }
}

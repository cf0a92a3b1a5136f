package tunwarden.forecast.vent;

import java.util.Locale;
import java.util.Optional;

/** Whether an orifice can belong to a vessel at all. */
public final class OrificeFit {
  private OrificeFit() {}

  /** What is wrong with it, as one sentence; a sphere is the widest a vessel can be taken for. */
  public static Optional<String> fault(double diameterM, double vesselM3) {
    double widestM = Math.cbrt(6 * vesselM3 / Math.PI);
    if (diameterM > 0 && diameterM < widestM) {
      return Optional.empty();
    }
    return Optional.of(
        diameterM > 0
            ? String.format(
                Locale.ROOT,
                "an orifice of %.0f mm is wider than a vessel of %.0f L; check its unit",
                1000 * diameterM,
                1000 * vesselM3)
            : "an orifice needs a diameter above 0 mm");
  }
}

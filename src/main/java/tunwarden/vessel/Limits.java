package tunwarden.vessel;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The pressures the user must not pass.
 *
 * @param relief the relief valve; empty where none was stated, and then no margin is spoken of
 * @param vesselPaGauge what the vessel is rated for (MAWP), Pa gauge
 * @param vacuumPaGauge lowest allowed pressure, Pa gauge, zero or negative
 */
public record Limits(
    Optional<ReliefSetting> relief, OptionalDouble vesselPaGauge, OptionalDouble vacuumPaGauge) {
  /** Nothing stated. */
  public static final Limits NONE =
      new Limits(Optional.empty(), OptionalDouble.empty(), OptionalDouble.empty());

  /** The vacuum the vessel may see; without a stated one, none at all. */
  public double vacuumOrNonePaGauge() {
    return vacuumPaGauge.orElse(0);
  }
}

package tunwarden.config;

import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefRule;
import tunwarden.vessel.ReliefSetting;

/**
 * The limits as a person stated them, not yet held against each other.
 *
 * @param reliefPaGauge set pressure of the relief valve, Pa gauge
 * @param tolerance how far below its setting it may open; ISO 4126-1 where not stated
 * @param vesselPaGauge what the vessel is rated for, Pa gauge
 * @param vacuumPaGauge lowest allowed pressure, Pa gauge
 */
public record StatedLimits(
    OptionalDouble reliefPaGauge,
    Optional<Tolerance> tolerance,
    OptionalDouble vesselPaGauge,
    OptionalDouble vacuumPaGauge) {

  /**
   * A tolerance as stated.
   *
   * @param rule the standard that fixes it, or {@link ReliefRule#STATED}
   * @param pa the stated width, Pa; of no meaning where a standard fixes it
   */
  public record Tolerance(ReliefRule rule, double pa) {
    /** Reads {@code ISO}, {@code ASME} or a pressure difference. */
    public static Tolerance parse(String text) {
      return switch (text) {
        case "ISO" -> new Tolerance(ReliefRule.ISO_4126, 0);
        case "ASME" -> new Tolerance(ReliefRule.ASME, 0);
        default -> new Tolerance(ReliefRule.STATED, Texts.pressureDifferencePa(text));
      };
    }

    private ReliefSetting of(double setPaGauge) {
      return switch (rule) {
        case ISO_4126 -> ReliefSetting.iso4126(setPaGauge);
        case ASME -> ReliefSetting.asme(setPaGauge);
        case STATED -> ReliefSetting.stated(setPaGauge, pa);
      };
    }
  }

  /** A limit that contradicts another, or what a limit is. */
  public static final class Contradiction extends BadInputException {
    private static final long serialVersionUID = 1;

    private final String key;

    Contradiction(String key, String sentence) {
      super(sentence);
      this.key = key;
    }

    /** Which of {@code relief}, {@code tolerance}, {@code vessel}, {@code vacuum}. */
    public String key() {
      return key;
    }
  }

  /**
   * The limits, checked.
   *
   * @throws Contradiction when they cannot all be true
   */
  public Limits check() {
    if (vacuumPaGauge.orElse(0) > 0) {
      throw new Contradiction("vacuum", "write zero or a negative gauge pressure");
    }
    if (!(vesselPaGauge.orElse(1) > 0)) {
      throw new Contradiction("vessel", "write a pressure above zero gauge");
    }
    return new Limits(setting(), vesselPaGauge, vacuumPaGauge);
  }

  private Optional<ReliefSetting> setting() {
    if (reliefPaGauge.isEmpty()) {
      if (tolerance.isPresent()) {
        throw new Contradiction("tolerance", "give the relief setting it belongs to");
      }
      return Optional.empty();
    }
    double set = reliefPaGauge.getAsDouble();
    if (!(set > 0)) {
      throw new Contradiction("relief", "write a setting above zero gauge");
    }
    if (set > vesselPaGauge.orElse(set)) {
      throw new Contradiction(
          "relief", "the setting is above what the vessel is rated for; check both");
    }
    ReliefSetting setting = tolerance.orElse(new Tolerance(ReliefRule.ISO_4126, 0)).of(set);
    if (!(setting.tolerancePa() < set)) {
      throw new Contradiction("tolerance", "it is as wide as the setting; check both");
    }
    return Optional.of(setting);
  }
}

package tunwarden.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Projection;
import tunwarden.forecast.relief.ReliefLevels;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;

/** Gathers every pressure that matters to one vessel, highest first. */
public final class Ladder {
  private Ladder() {}

  /**
   * The rungs for the limits, the present reading and the futures.
   *
   * @param limits what the user must not pass
   * @param pressure the newest pressure, Pa gauge; without a value there is no rung for now
   * @param outlook the futures
   */
  public static List<Rung> of(Limits limits, Observed pressure, Outlook outlook) {
    List<Rung> rungs = new ArrayList<>();
    limits
        .vesselPaGauge()
        .ifPresent(pa -> rungs.add(new Rung(Rung.Kind.VESSEL_LIMIT, pa, "vessel limit")));
    limits.relief().ifPresent(relief -> addRelief(rungs, relief));
    for (Projection projection : outlook.projections()) {
      rungs.add(new Rung(Rung.Kind.FORECAST, projection.paGauge(), projection.words()));
    }
    if (pressure.value().isPresent()) {
      rungs.add(new Rung(Rung.Kind.NOW, pressure.value().getAsDouble(), "now"));
    }
    rungs.add(new Rung(Rung.Kind.ATMOSPHERE, 0, "atmosphere"));
    limits
        .vacuumPaGauge()
        .ifPresent(pa -> rungs.add(new Rung(Rung.Kind.VACUUM_LIMIT, pa, "vacuum limit")));
    rungs.sort(Comparator.comparingDouble(Rung::paGauge).reversed());
    return rungs;
  }

  private static void addRelief(List<Rung> rungs, ReliefSetting relief) {
    rungs.add(new Rung(Rung.Kind.RELIEF_SET, relief.setPaGauge(), "relief set"));
    ReliefLevels levels = ReliefLevels.of(relief);
    rungs.add(new Rung(Rung.Kind.ACCUMULATION, levels.accumulationPaGauge(), "full flow at last"));
    rungs.add(
        new Rung(
            Rung.Kind.EARLIEST_LIFT,
            levels.earliestLiftPaGauge(),
            "earliest lift" + standard(relief)));
    if (levels.operatingCeilingPaGauge() > 0) {
      rungs.add(
          new Rung(
              Rung.Kind.OPERATING_CEILING, levels.operatingCeilingPaGauge(), "operating ceiling"));
    }
    if (levels.lowestReseatPaGauge() > 0) {
      rungs.add(new Rung(Rung.Kind.RESEAT, levels.lowestReseatPaGauge(), "shut again at last"));
    }
  }

  /** Which standard says so, short; nothing where the person stated the tolerance. */
  private static String standard(ReliefSetting relief) {
    return switch (relief.rule()) {
      case STATED -> "";
      case ISO_4126 -> ", ISO";
      case ASME -> ", ASME";
    };
  }
}

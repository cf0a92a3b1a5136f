package tunwarden.app.reckon;

import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.relief.Demand;
import tunwarden.forecast.relief.Demands;
import tunwarden.forecast.relief.FireHeat;
import tunwarden.forecast.relief.ReliefCase;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;
import tunwarden.vessel.Vessel;

/** What can press on a relief valve. */
final class ReliefSources {
  private static final double HOUR_S = 3600;

  @Option(
      names = "--extract-drop",
      paramLabel = "EXTRACT",
      converter = Convert.ToGravity.class,
      description = {
        "Fermentation: fall of the apparent extract in a day, as '6 P'. Default for a vessel",
        "of a drink that ferments: 10 P, which no ordinary brew exceeds."
      })
  private Double dropPlato;

  @Option(
      names = "--warming",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToKelvinDifference.class,
      description = "Warm-up: how much in an hour, as '5 C'.")
  private Double warmingK;

  @Mixin private SupplyOptions supply;

  @Option(
      names = "--fire-area",
      paramLabel = "AREA",
      converter = ToSquareMetres.class,
      description = "External fire: wetted surface up to 7.6 m above it, as '12 m2'.")
  private Double fireM2;

  @Option(
      names = "--drained",
      description = "Spilled fuel drains away and firemen are at hand (API 521).")
  private boolean drained;

  /** Area: m². */
  static final class ToSquareMetres implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      return above(text, Quantities.parse(text, Kind.AREA));
    }
  }

  private static double above(String text, double value) {
    if (!(value > 0)) {
      throw new BadInputException("'" + text + "' is not above zero");
    }
    return value;
  }

  /**
   * The demands that were asked for.
   *
   * @param valve the valve
   * @param vessel what it protects
   * @param sized whether its volume and fill were stated
   */
  List<Demand> demands(ReliefCase valve, Vessel vessel, boolean sized) {
    if (!sized && (dropPlato != null || warmingK != null || fireM2 != null)) {
      throw new BadInputException(
          "--volume and --fill are missing; without them fermentation, warming and fire have no"
              + " size");
    }
    List<Demand> demands = new ArrayList<>();
    if (dropPlato != null || (sized && ferments(vessel))) {
      double rate =
          dropPlato == null
              ? FermentationRate.SCREENING_KG_PER_M3_PER_S
              : FermentationRate.ofDrop(dropPlato);
      demands.add(Demands.fermentation(valve, vessel.fillM3(), rate));
    }
    if (warmingK != null) {
      demands.add(Demands.warming(valve, vessel, warmingK / HOUR_S));
    }
    addSupply(demands, valve);
    if (fireM2 != null) {
      demands.add(Demands.fire(valve, vessel, FireHeat.watts(fireM2, drained)));
    }
    return demands;
  }

  private void addSupply(List<Demand> demands, ReliefCase valve) {
    if (supply.flowKgPerS().isPresent()) {
      demands.add(Demands.statedSupply(valve, supply.flowKgPerS().get()));
      return;
    }
    supply
        .through(valve.ambientPaAbsolute())
        .ifPresent(
            failed ->
                demands.add(
                    Demands.supply(
                        valve,
                        failed.paGauge() + valve.ambientPaAbsolute(),
                        failed.seat().orElseThrow())));
  }

  private static boolean ferments(Vessel vessel) {
    return switch (vessel.liquid().kind()) {
      case BEER, WINE, SPARKLING_WINE, CIDER, KOMBUCHA -> true;
      case WATER, MINERAL_WATER, SOFT_DRINK -> false;
    };
  }
}

package tunwarden.forecast.whatif;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Present;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.Words;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.relief.Demand;
import tunwarden.forecast.relief.Demands;
import tunwarden.forecast.relief.FireHeat;
import tunwarden.forecast.relief.ReliefCase;
import tunwarden.units.Display;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** What a relief valve passes against every source of gas that was told. */
final class ReliefShares {
  private static final double HOUR_S = 3600;
  private static final double PERCENT = 100;

  private ReliefShares() {}

  static Optional<WhatIf> of(Present present, Optional<WarmingTime> warming) {
    Vessel vessel = present.vessel();
    if (vessel.limits().relief().isEmpty() || vessel.orifice().isEmpty()) {
      return Optional.empty();
    }
    ReliefCase valve = valve(present, vessel.limits().relief().get(), vessel.orifice().get());
    List<Demand> demands = demands(present, valve, warming);
    return Optional.of(
        new WhatIf(
            WhatIf.Kind.RELIEF,
            "relief valve passes",
            Optional.empty(),
            Optional.empty(),
            words(valve, demands),
            Demands.NOT_COVERED,
            cautions(demands)));
  }

  private static ReliefCase valve(Present present, ReliefSetting setting, ReliefOrifice path) {
    return new ReliefCase(
        setting,
        path,
        present.vessel().gas(),
        present.temperatureK(),
        present.vessel().site().ambientPaAbsolute());
  }

  private static List<Demand> demands(
      Present present, ReliefCase valve, Optional<WarmingTime> warming) {
    Vessel vessel = present.vessel();
    Prospects told = vessel.prospects();
    List<Demand> demands = new ArrayList<>();
    told.ferment()
        .ifPresent(
            ferment -> {
              double made =
                  ferment.dropPlatoPerDay().isPresent()
                      ? FermentationRate.ofDrop(ferment.dropPlatoPerDay().getAsDouble())
                      : FermentationRate.SCREENING_KG_PER_M3_PER_S;
              demands.add(Demands.fermentation(valve, vessel.fillM3(), made));
            });
    double gapK = vessel.warmToK().orElse(0) - present.temperatureK();
    if (gapK > 0 && warming.isPresent()) {
      demands.add(Demands.warming(valve, vessel, gapK / warming.get().timeS().low()));
    }
    told.supply().ifPresent(supply -> addSupply(demands, valve, supply));
    if (told.fireM2().isPresent()) {
      double watts = FireHeat.watts(told.fireM2().getAsDouble(), false);
      demands.add(Demands.fire(valve, vessel, watts));
    }
    return demands;
  }

  private static void addSupply(List<Demand> demands, ReliefCase valve, Prospects.Supply supply) {
    double pa = supply.paGauge() + valve.ambientPaAbsolute();
    if (supply.kgPerS().isPresent()) {
      demands.add(Demands.statedSupply(valve, supply.kgPerS().getAsDouble()));
    } else if (supply.seat().isPresent() && pa > valve.relievingPaAbsolute()) {
      demands.add(Demands.supply(valve, pa, supply.seat().get()));
    }
  }

  private static String words(ReliefCase valve, List<Demand> demands) {
    String capacity = Display.number(HOUR_S * valve.gasKgPerS(), 0) + " kg/h of gas";
    String shares =
        demands.stream()
            .map(d -> d.source().word() + " " + percent(d.share()) + " %")
            .collect(Collectors.joining(", "));
    return capacity
        + " at "
        + Words.gauge(valve.relievingPaAbsolute() - valve.ambientPaAbsolute())
        + (shares.isEmpty() ? "; no source of gas is stated" : "; used by " + shares);
  }

  private static String percent(double share) {
    double percent = PERCENT * share;
    return percent < 0.1 ? "less than 0.1" : Display.number(percent, percent < 1 ? 1 : 0);
  }

  private static List<Caution> cautions(List<Demand> demands) {
    String beyond =
        demands.stream()
            .filter(demand -> !demand.isMet())
            .map(demand -> demand.source().word())
            .collect(Collectors.joining(", "));
    return beyond.isEmpty()
        ? List.of()
        : List.of(
            new Caution(
                true,
                "Even of gas alone it passes too little for: "
                    + beyond
                    + ". A licensed engineer must size it under the local code."));
  }
}

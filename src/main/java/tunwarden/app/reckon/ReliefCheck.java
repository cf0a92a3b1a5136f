package tunwarden.app.reckon;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.app.options.VesselOptions;
import tunwarden.forecast.relief.Demand;
import tunwarden.forecast.relief.Demands;
import tunwarden.forecast.relief.ReliefCase;
import tunwarden.forecast.relief.ReliefLevels;
import tunwarden.forecast.vent.OrificeFit;
import tunwarden.units.BadInputException;
import tunwarden.units.Constants;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.units.Pressure;
import tunwarden.units.Unit;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** Rated flow of a relief valve against what can press on it. */
@Command(
    name = "relief",
    description = "Rated flow of a relief valve against fermentation, warm-up, supply and fire.")
final class ReliefCheck extends AnswerCommand {
  private static final double ROOM_K = 20 + Constants.ZERO_CELSIUS_K;

  /** Nozzle model, setting and atmosphere together, relative, 95 %, by judgement. */
  private static final double CAPACITY_U95 = 0.05;

  @Option(
      names = "--orifice",
      required = true,
      paramLabel = "LENGTH",
      converter = Convert.ToDiameter.class,
      description = "Flow diameter of the valve, as '15 mm'.")
  private double orificeM;

  @Option(
      names = "--kd",
      required = true,
      paramLabel = "NUMBER",
      converter = Convert.ToCoefficient.class,
      description = "Certified coefficient of discharge, derated if so required.")
  private double kd;

  @Option(
      names = "--temperature",
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Temperature of gas and liquid. Default: 20 C.")
  private double temperatureK = ROOM_K;

  @Option(
      names = "--pressure",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Present pressure, if the setting is to be checked against it.")
  private Pressure pressure;

  @Mixin private ReliefSources sources;
  @Mixin private VesselOptions vessel;

  @Override
  void fill(AnswerSheet sheet) {
    Vessel described = vessel.vesselOfAnySize("vessel");
    ReliefSetting setting =
        described
            .limits()
            .relief()
            .orElseThrow(
                () -> new BadInputException("--relief is missing; write it as '--relief 1.5bar'"));
    if (vessel.areSized()) {
      OrificeFit.fault(orificeM, described.volumeM3())
          .ifPresent(
              sentence -> {
                throw new BadInputException("--orifice: " + sentence);
              });
    }
    if (pressure != null) {
      PresentOptions.refuseRelief(described, vessel.gaugePa(pressure));
    }
    ReliefCase valve =
        new ReliefCase(
            setting,
            new ReliefOrifice(orificeM, kd),
            described.gas(),
            temperatureK,
            described.site().ambientPaAbsolute());
    capacity(sheet, valve);
    demands(sheet, sources.demands(valve, described, vessel.areSized()));
    sheet.model(
        "isentropic nozzle, critical and subcritical, as API 520-1 and ISO 4126-7 print it;"
            + " overpressure as "
            + setting.rule().words().replace(" tolerance", "")
            + "; Balling; API 521 fire heat");
    sheet.assume(
        "all of the valve's flow path open, gas at the vessel's temperature, straight into the open"
            + " air");
    sheet.assume("each source by itself, not several at once");
    sheet.caution(Demands.NOT_COVERED);
    sheet.caution("never block, reset or adjust a relief valve");
  }

  private static void capacity(AnswerSheet sheet, ReliefCase valve) {
    double kgPerH = Unit.KILOGRAM_PER_HOUR.fromSi(valve.gasKgPerS());
    sheet.number("capacity_kg_per_h", "capacity", kgPerH, CAPACITY_U95 * kgPerH, "kg/h");
    double relieving = valve.relievingPaAbsolute() - valve.ambientPaAbsolute();
    sheet.hidden("relieving_pressure_bar_g", Unit.BAR.fromSi(relieving));
    sheet.line("at", sheet.display().gauge(relieving) + ", setting and overpressure");
    ReliefLevels levels = ReliefLevels.of(valve.setting());
    sheet.hidden("earliest_lift_bar_g", Unit.BAR.fromSi(levels.earliestLiftPaGauge()));
    sheet.hidden("lowest_reseat_bar_g", Unit.BAR.fromSi(levels.lowestReseatPaGauge()));
    sheet.hidden("operating_ceiling_bar_g", Unit.BAR.fromSi(levels.operatingCeilingPaGauge()));
  }

  private static void demands(AnswerSheet sheet, List<Demand> demands) {
    Map<String, Object> flows = new LinkedHashMap<>();
    Map<String, Object> doubts = new LinkedHashMap<>();
    Map<String, Object> shares = new LinkedHashMap<>();
    boolean adequate = true;
    for (Demand demand : demands) {
      String source = demand.source().word();
      double kgPerH = Unit.KILOGRAM_PER_HOUR.fromSi(demand.kgPerS());
      flows.put(source, kgPerH);
      doubts.put(source, demand.source().relativeU95() * kgPerH);
      shares.put(source, demand.share());
      adequate &= demand.isMet();
      sheet.line(
          source,
          Display.number(kgPerH, 1)
              + " kg/h, "
              + Display.number(100 * demand.share(), 0)
              + " % of capacity: "
              + InUnits.of(demand.words(), sheet.display()));
    }
    sheet.hidden("demand_kg_per_h", flows);
    sheet.hidden("u95_demand_kg_per_h", doubts);
    sheet.hidden("share_used", shares);
    if (demands.isEmpty()) {
      sheet.none("adequate", "adequate", "no source was stated; see --help");
      return;
    }
    sheet.plain(
        "adequate", adequate, "adequate", adequate ? "yes, for the gas of these sources" : "no");
    if (!adequate) {
      sheet.no();
    }
  }
}

package tunwarden.app.reckon;

import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.ReliefOrifice;

/** A gas supply whose regulator fails open. */
final class SupplyOptions {
  private static final double USUAL_KD = 0.6;

  @Option(
      names = "--supply",
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Supply failed open: pressure behind the regulator.")
  private Pressure pressure;

  @Option(
      names = "--supply-orifice",
      paramLabel = "LENGTH",
      converter = Convert.ToDiameter.class,
      description = "Its widest opening, as '3 mm'.")
  private Double orificeM;

  @Option(
      names = "--supply-flow",
      paramLabel = "FLOW",
      converter = ToKgPerS.class,
      description = "Or its largest flow, as '30 kg/h'.")
  private Double flowKgPerS;

  /** Mass flow: kg/s. */
  static final class ToKgPerS implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      double value = Quantities.parse(text, Kind.MASS_FLOW);
      if (!(value > 0)) {
        throw new BadInputException("'" + text + "' is not above zero");
      }
      return value;
    }
  }

  /** The stated flow alone, kg/s. */
  Optional<Double> flowKgPerS() {
    return Optional.ofNullable(flowKgPerS);
  }

  /**
   * The supply by its pressure and opening; empty where nothing of it was said.
   *
   * @param ambientPaAbsolute atmosphere, Pa absolute
   * @throws BadInputException when half of it was said
   */
  Optional<Prospects.Supply> through(double ambientPaAbsolute) {
    if (pressure == null && orificeM == null) {
      return Optional.empty();
    }
    if (pressure == null || orificeM == null) {
      throw new BadInputException("--supply and --supply-orifice go together, or --supply-flow");
    }
    return Optional.of(
        new Prospects.Supply(
            pressure.gaugePa(ambientPaAbsolute), Optional.of(seat()), OptionalDouble.empty()));
  }

  /**
   * The supply with its pressure and, if stated, its opening or its flow.
   *
   * @param ambientPaAbsolute atmosphere, Pa absolute
   * @throws BadInputException when its pressure was not said, or both opening and flow were
   */
  Prospects.Supply required(double ambientPaAbsolute) {
    if (pressure == null) {
      throw new BadInputException("--supply is missing; write it as '--supply 8bar'");
    }
    if (orificeM != null && flowKgPerS != null) {
      throw new BadInputException("give --supply-orifice or --supply-flow, not both");
    }
    return new Prospects.Supply(
        pressure.gaugePa(ambientPaAbsolute),
        orificeM == null ? Optional.empty() : Optional.of(seat()),
        flowKgPerS == null ? OptionalDouble.empty() : OptionalDouble.of(flowKgPerS));
  }

  private ReliefOrifice seat() {
    return new ReliefOrifice(orificeM, USUAL_KD);
  }
}

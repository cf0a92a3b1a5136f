package tunwarden.app.options;

import picocli.CommandLine.ITypeConverter;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Closure;

/** Texts of options to quantities in SI; a text that will not do is told in one sentence. */
public final class Convert {
  private Convert() {}

  /** Gauge unless its unit says absolute. */
  public static final class ToPressure implements ITypeConverter<Pressure> {
    @Override
    public Pressure convert(String text) {
      return Pressure.parse(text);
    }
  }

  /** Absolute whatever its unit says, for quantities that have no gauge form: Pa. */
  public static final class ToAbsolutePa implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      return notNegative(text, Pressure.parse(text).pa());
    }
  }

  /** A difference of two pressures: Pa. */
  public static final class ToPressureDifferencePa implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      Pressure pressure = Pressure.parse(text);
      if (pressure.reference() == Pressure.Reference.ABSOLUTE) {
        throw new BadInputException("'" + text + "' is a difference; write it without 'a'");
      }
      return notNegative(text, pressure.pa());
    }
  }

  /** Temperature: K. */
  public static final class ToKelvin implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      double kelvin = Quantities.parse(text, Kind.TEMPERATURE);
      if (!(kelvin > 0)) {
        throw new BadInputException("'" + text + "' is below absolute zero");
      }
      return kelvin;
    }
  }

  /** Temperature difference: K. */
  public static final class ToKelvinDifference extends Plain {
    public ToKelvinDifference() {
      super(Kind.TEMPERATURE_DIFFERENCE);
    }
  }

  /** Volume: m³. */
  public static final class ToCubicMetres extends Plain {
    public ToCubicMetres() {
      super(Kind.VOLUME);
    }
  }

  /** Length: m. */
  public static final class ToMetres extends Plain {
    public ToMetres() {
      super(Kind.LENGTH);
    }
  }

  /** Rate: 1/s. */
  public static final class ToPerSecond extends Plain {
    public ToPerSecond() {
      super(Kind.RATE);
    }
  }

  /** Gas or sugar content: kg/m³. */
  public static final class ToContent extends Plain {
    public ToContent() {
      super(Kind.GAS_CONTENT);
    }
  }

  /** Extract or gravity: degrees Plato. */
  public static final class ToPlato extends Plain {
    public ToPlato() {
      super(Kind.EXTRACT);
    }
  }

  /** Share: 0..1. */
  public static final class ToShare implements ITypeConverter<Double> {
    @Override
    public Double convert(String text) {
      double share = notNegative(text, Quantities.parse(text, Kind.FRACTION));
      if (share > 1) {
        throw new BadInputException("'" + text + "' is more than the whole; write at most 100 %");
      }
      return share;
    }
  }

  /** Dry gas by composition. */
  public static final class ToGas implements ITypeConverter<GasMix> {
    @Override
    public GasMix convert(String text) {
      return GasMix.parse(text);
    }
  }

  /** Kind of drink. */
  public static final class ToLiquidKind implements ITypeConverter<LiquidKind> {
    @Override
    public LiquidKind convert(String text) {
      return LiquidKind.ofWord(text)
          .orElseThrow(() -> unknown(text, "a liquid", LiquidKind.words()));
    }
  }

  /** Trade relation for beer. */
  public static final class ToBeerMethod implements ITypeConverter<BeerMethod> {
    @Override
    public BeerMethod convert(String text) {
      return BeerMethod.ofWord(text)
          .orElseThrow(() -> unknown(text, "a method", "european, chart"));
    }
  }

  /** How the headspace is connected. */
  public static final class ToClosure implements ITypeConverter<Closure> {
    @Override
    public Closure convert(String text) {
      return Closure.ofWord(text)
          .orElseThrow(() -> unknown(text, "a closure", "sealed, supply, spunding, open, infer"));
    }
  }

  /** A quantity of one kind that cannot be negative, in SI. */
  abstract static class Plain implements ITypeConverter<Double> {
    private final Kind kind;

    Plain(Kind kind) {
      this.kind = kind;
    }

    @Override
    public Double convert(String text) {
      return notNegative(text, Quantities.parse(text, kind));
    }
  }

  private static double notNegative(String text, double value) {
    if (!(value >= 0)) {
      throw new BadInputException("'" + text + "' is negative; write zero or more");
    }
    return value;
  }

  private static BadInputException unknown(String text, String what, String known) {
    return new BadInputException("'" + text + "' is not " + what + "; write one of " + known);
  }
}

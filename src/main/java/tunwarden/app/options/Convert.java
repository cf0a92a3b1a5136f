package tunwarden.app.options;

import java.util.function.Function;
import picocli.CommandLine.ITypeConverter;
import tunwarden.config.StatedLimits;
import tunwarden.config.Texts;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.Display;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Site;

/** Binds the texts of options to the parsers that cellar files use too. */
public abstract class Convert<T> implements ITypeConverter<T> {
  private final Function<String, T> parser;

  Convert(Function<String, T> parser) {
    this.parser = parser;
  }

  @Override
  public T convert(String text) {
    return parser.apply(text);
  }

  /** Gauge unless its unit says absolute. */
  public static final class ToPressure extends Convert<Pressure> {
    ToPressure() {
      super(Pressure::parse);
    }
  }

  /** Absolute whatever its unit says, for quantities that have no gauge form: Pa. */
  public static final class ToAbsolutePa extends Convert<Double> {
    ToAbsolutePa() {
      super(Texts::absolutePa);
    }
  }

  /** A difference of two pressures: Pa. */
  public static final class ToPressureDifferencePa extends Convert<Double> {
    ToPressureDifferencePa() {
      super(Texts::pressureDifferencePa);
    }
  }

  /** Units to print in. */
  public static final class ToDisplay extends Convert<Display> {
    ToDisplay() {
      super(Texts::display);
    }
  }

  /** How early a relief valve may open. */
  public static final class ToTolerance extends Convert<StatedLimits.Tolerance> {
    ToTolerance() {
      super(StatedLimits.Tolerance::parse);
    }
  }

  /** Temperature: K. */
  public static final class ToKelvin extends Convert<Double> {
    ToKelvin() {
      super(Texts::kelvin);
    }
  }

  /** Temperature difference: K. */
  public static final class ToKelvinDifference extends Convert<Double> {
    ToKelvinDifference() {
      super(Texts.of(Kind.TEMPERATURE_DIFFERENCE));
    }
  }

  /** Volume: m³. */
  public static final class ToCubicMetres extends Convert<Double> {
    ToCubicMetres() {
      super(Texts.of(Kind.VOLUME));
    }
  }

  /** Length: m. */
  public static final class ToMetres extends Convert<Double> {
    ToMetres() {
      super(Texts.of(Kind.LENGTH));
    }
  }

  /** Length above zero: m. */
  public static final class ToDiameter extends Convert<Double> {
    ToDiameter() {
      super(Texts::diameterM);
    }
  }

  /** Time: s. */
  public static final class ToSeconds extends Convert<Double> {
    ToSeconds() {
      super(Texts.of(Kind.DURATION));
    }
  }

  /** Rate: 1/s. */
  public static final class ToPerSecond extends Convert<Double> {
    ToPerSecond() {
      super(Texts.of(Kind.RATE));
    }
  }

  /** Gas or sugar content: kg/m³. */
  public static final class ToContent extends Convert<Double> {
    ToContent() {
      super(Texts.of(Kind.GAS_CONTENT));
    }
  }

  /** Extract or gravity: degrees Plato. */
  public static final class ToPlato extends Convert<Double> {
    ToPlato() {
      super(Texts.of(Kind.EXTRACT));
    }
  }

  /** Gravity or apparent extract, which may lie below water's: degrees Plato. */
  public static final class ToGravity extends Convert<Double> {
    ToGravity() {
      super(Texts::gravityPlato);
    }
  }

  /** Share: 0..1. */
  public static final class ToShare extends Convert<Double> {
    ToShare() {
      super(Texts::share);
    }
  }

  /** A plain number above 0 and at most 1. */
  public static final class ToCoefficient extends Convert<Double> {
    ToCoefficient() {
      super(Texts::coefficient);
    }
  }

  /** Dry gas by composition. */
  public static final class ToGas extends Convert<GasMix> {
    ToGas() {
      super(GasMix::parse);
    }
  }

  /** A place whose air pressure was measured. */
  public static final class ToMeasuredSite extends Convert<Site> {
    ToMeasuredSite() {
      super(text -> Site.measured(Texts.absolutePa(text)));
    }
  }

  /** A place by its altitude. */
  public static final class ToSiteAtAltitude extends Convert<Site> {
    ToSiteAtAltitude() {
      super(text -> Site.atAltitude(Quantities.parse(text, Kind.LENGTH)));
    }
  }

  /** Kind of drink. */
  public static final class ToLiquidKind extends Convert<LiquidKind> {
    ToLiquidKind() {
      super(Texts::liquidKind);
    }
  }

  /** Trade relation for beer. */
  public static final class ToBeerMethod extends Convert<BeerMethod> {
    ToBeerMethod() {
      super(Texts::beerMethod);
    }
  }

  /** How the headspace is connected. */
  public static final class ToClosure extends Convert<Closure> {
    ToClosure() {
      super(Texts::closure);
    }
  }
}

package tunwarden.wire.measure;

import java.time.Instant;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.units.Pressure;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.signal.Decoded;

/** Makes samples of a vessel from what its instrument sent. */
public final class Samples {
  private Samples() {}

  /** The reading, calibrated and counted as its quantity is; or the fault in its place. */
  public static Sample of(Decoded decoded, Binding binding, Instant time) {
    if (decoded.isBad()) {
      return fault(binding, time, decoded.quality(), decoded.detail());
    }
    double value = counted(binding.trim().calibration().apply(decoded.si()), binding);
    if (!Double.isFinite(value)) {
      return fault(binding, time, Quality.NOT_FINITE, String.valueOf(value));
    }
    return new Reading(time, binding.vessel(), binding.quantity(), value, 0, decoded.quality());
  }

  /** The absence of a value. */
  public static Fault fault(Binding binding, Instant time, Quality quality, String detail) {
    return new Fault(time, binding.vessel(), binding.quantity(), quality, detail);
  }

  /** What the instrument itself would show for a value of the quantity; undoes {@link #of}. */
  public static double shown(double quantitySi, Binding binding) {
    double own = quantitySi;
    if (binding.quantity() == Quantity.PRESSURE) {
      own = quantitySi + (isAbsolute(binding) ? binding.trim().ambientPa() : 0);
    } else if (binding.quantity() == Quantity.BAROMETER) {
      own = quantitySi - (isAbsolute(binding) ? 0 : binding.trim().ambientPa());
    }
    return binding.trim().calibration().undo(own);
  }

  private static double counted(double own, Binding binding) {
    if (binding.quantity() == Quantity.PRESSURE) {
      return own - (isAbsolute(binding) ? binding.trim().ambientPa() : 0);
    }
    if (binding.quantity() == Quantity.BAROMETER) {
      return own + (isAbsolute(binding) ? 0 : binding.trim().ambientPa());
    }
    return own;
  }

  private static boolean isAbsolute(Binding binding) {
    return binding.field().reference() == Pressure.Reference.ABSOLUTE;
  }
}

package tunwarden.config;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.config.profile.Profiles;
import tunwarden.serial.PairGate;
import tunwarden.serial.PortPlan;
import tunwarden.units.BadInputException;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.signal.Calibration;

/** Turns the instruments of a cellar file into what is to be read over each serial port. */
public final class PortPlans {
  private final Cellar cellar;
  private final Path folder;

  private PortPlans(Cellar cellar) {
    this.cellar = cellar;
    Path parent = cellar.file().toAbsolutePath().getParent();
    this.folder = parent;
  }

  /**
   * One plan for each port, in the order of the file.
   *
   * @throws BadInputException naming file and instrument when a profile, a field or a line does not
   *     fit
   */
  public static List<PortPlan> of(Cellar cellar) {
    return new PortPlans(cellar).plans();
  }

  private List<PortPlan> plans() {
    Map<String, List<Binding>> byPort = new LinkedHashMap<>();
    for (Instrument instrument : cellar.instruments()) {
      byPort.computeIfAbsent(instrument.port(), port -> new ArrayList<>()).add(binding(instrument));
    }
    List<PortPlan> plans = new ArrayList<>();
    byPort.forEach((port, bindings) -> plans.add(plan(port, bindings)));
    return plans;
  }

  private PortPlan plan(String port, List<Binding> bindings) {
    try {
      return new PortPlan(port, bindings);
    } catch (IllegalArgumentException unfit) {
      throw new BadInputException(cellar.file() + ": " + unfit.getMessage(), unfit);
    }
  }

  private Binding binding(Instrument instrument) {
    Profile profile = profile(instrument);
    Field field =
        profile
            .field(instrument.field())
            .orElseThrow(
                () ->
                    new BadInputException(
                        where(instrument)
                            + ": device '"
                            + profile.name()
                            + "' has no field '"
                            + instrument.field()
                            + "'; it has "
                            + String.join(", ", profile.fields().keySet())));
    Binding.Trim trim =
        new Binding.Trim(
            instrument.worth().calibration().orElse(Calibration.NONE),
            cellar.site().ambientPaAbsolute(),
            instrument.every().orElse(profile.polling().period()),
            instrument.accuracyU95().orElse(field.trust().u95Si()));
    try {
      return new Binding(
          instrument.vessel() + (instrument.worth().check() ? PairGate.CHECK : ""),
          instrument.quantity(),
          profile,
          field,
          instrument.address().orElse(0),
          trim);
    } catch (IllegalArgumentException unfit) {
      throw new BadInputException(where(instrument) + ": " + unfit.getMessage(), unfit);
    }
  }

  private Profile profile(Instrument instrument) {
    Profile found;
    try {
      found = Profiles.find(instrument.device(), folder);
    } catch (BadInputException missing) {
      throw new BadInputException(where(instrument) + ": " + missing.getMessage(), missing);
    }
    Optional<Integer> baud = instrument.baud();
    return baud.isEmpty() ? found : atSpeed(found, baud.get());
  }

  private static Profile atSpeed(Profile profile, int baud) {
    return new Profile(
        profile.name(),
        profile.title(),
        profile.speaks(),
        profile.line().atBaud(baud),
        profile.framing(),
        profile.polling(),
        profile.fields());
  }

  private String where(Instrument instrument) {
    return cellar.file()
        + ", vessel."
        + instrument.vessel()
        + ".readings."
        + instrument.quantity().word();
  }
}

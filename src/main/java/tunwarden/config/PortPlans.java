package tunwarden.config;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tunwarden.config.profile.Profiles;
import tunwarden.reading.Quantity;
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

  private final Map<String, Profile> profiles = new HashMap<>();
  private final List<Misfit> misfits = new ArrayList<>();

  /** What does not fit, and the keys it stands under. */
  private record Misfit(List<String> path, String sentence) {}

  private PortPlans(Cellar cellar) {
    this.cellar = cellar;
    Path parent = cellar.file().toAbsolutePath().getParent();
    this.folder = parent;
  }

  /**
   * One plan for each port, in the order of the file. Instruments out of service are not read.
   *
   * @throws BadCellarException naming line and key of everything that does not fit: profiles,
   *     fields, lines
   */
  public static List<PortPlan> of(Cellar cellar) {
    return new PortPlans(cellar).plans();
  }

  private List<PortPlan> plans() {
    Map<String, List<Binding>> byPort = new LinkedHashMap<>();
    for (Instrument instrument : cellar.instruments()) {
      try {
        Binding binding = binding(instrument);
        if (instrument.worth().outOfService().isEmpty()) {
          byPort.computeIfAbsent(instrument.port(), port -> new ArrayList<>()).add(binding);
        }
      } catch (IllegalArgumentException unfit) {
        misfits.add(new Misfit(path(instrument), unfit.getMessage()));
      }
    }
    List<PortPlan> plans = new ArrayList<>();
    byPort.forEach((port, bindings) -> plan(port, bindings).ifPresent(plans::add));
    throwIfAny();
    return plans;
  }

  private Optional<PortPlan> plan(String port, List<Binding> bindings) {
    try {
      return Optional.of(new PortPlan(port, bindings));
    } catch (IllegalArgumentException unfit) {
      List<String> path =
          cellar.instruments().stream()
              .filter(instrument -> instrument.port().equals(port))
              .findFirst()
              .map(PortPlans::path)
              .orElse(List.of());
      misfits.add(new Misfit(path, unfit.getMessage()));
      return Optional.empty();
    }
  }

  /** The file is looked into again, for the lines, only when something is wrong. */
  private void throwIfAny() {
    if (misfits.isEmpty()) {
      return;
    }
    String text;
    try {
      text = Files.readString(cellar.file());
    } catch (IOException gone) {
      text = "";
    }
    Problems problems = new Problems(cellar.file().toString(), LineIndex.of(text));
    Set<Misfit> once = new LinkedHashSet<>(misfits);
    once.forEach(misfit -> problems.add(misfit.path(), misfit.sentence()));
    problems.throwIfAny();
  }

  private static List<String> path(Instrument instrument) {
    if (instrument.quantity() == Quantity.BAROMETER) {
      return List.of("site", "barometer");
    }
    String key =
        instrument.quantity().word() + (instrument.worth().check() ? ReadingsReader.CHECK : "");
    return List.of("vessel", instrument.vessel(), "readings", key);
  }

  private Binding binding(Instrument instrument) {
    Profile profile = profile(instrument);
    Field field =
        profile
            .field(instrument.field())
            .orElseThrow(
                () ->
                    new BadInputException(
                        "device '"
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
    return new Binding(
        instrument.vessel() + (instrument.worth().check() ? PairGate.CHECK : ""),
        instrument.quantity(),
        profile,
        field,
        instrument.address().orElse(0),
        trim);
  }

  private Profile profile(Instrument instrument) {
    Profile found =
        profiles.computeIfAbsent(instrument.device(), device -> Profiles.find(device, folder));
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
}

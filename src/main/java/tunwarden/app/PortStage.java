package tunwarden.app;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Locale;
import java.util.stream.Collectors;
import tunwarden.config.profile.Profiles;
import tunwarden.reading.Reading;
import tunwarden.rehearse.PortRehearsal;
import tunwarden.rehearse.Rehearsal;
import tunwarden.rehearse.Scenario;
import tunwarden.replay.LogRow;
import tunwarden.serial.PortException;
import tunwarden.serial.SerialLinks;
import tunwarden.units.BadInputException;
import tunwarden.units.Unit;
import tunwarden.vessel.Site;
import tunwarden.wire.profile.Profile;

/** Plays a rehearsal on a serial port and says what the instrument shows. */
record PortStage(String port, String device, int address, double pace) {
  private static final Duration EVERY = Duration.ofSeconds(1);
  private static final double FASTEST = 100_000;

  PortStage {
    if (!(pace > 0 && pace <= FASTEST)) {
      throw new BadInputException("--pace must be above 0 and at most 100000");
    }
    if (address < 1 || address > 247) {
      throw new BadInputException("--address must be 1 to 247");
    }
  }

  /** Until the port goes or the program is ended. */
  int play(Scenario scenario, long seed, PrintWriter out) {
    Profile profile = Profiles.find(device, Path.of(""));
    Rehearsal rehearsal = Rehearsal.endless(scenario, seed, Instant.EPOCH, EVERY);
    out.println(
        "rehearsal, not measured: " + scenario.words() + "; " + profile.name() + " on " + port);
    PortRehearsal.Stage stage = new PortRehearsal.Stage(port, profile, address, pace);
    PortRehearsal playing = new PortRehearsal(rehearsal, stage, Site.SEA_LEVEL.ambientPaAbsolute());
    try {
      playing.play(new SerialLinks(), () -> !out.checkError(), row -> say(row, out));
      return 0;
    } catch (PortException e) {
      if (e.reason() == PortException.Reason.GONE) {
        out.println(e.getMessage());
        return Faults.FAILED;
      }
      throw new BadInputException(e.getMessage(), e);
    }
  }

  private static void say(LogRow row, PrintWriter out) {
    String values =
        row.samples().stream()
            .filter(sample -> sample instanceof Reading)
            .map(sample -> words((Reading) sample))
            .collect(Collectors.joining("  "));
    Duration since = Duration.between(Instant.EPOCH, row.time());
    out.printf(Locale.ROOT, "%6d s  %s%n", since.toSeconds(), values);
  }

  private static String words(Reading reading) {
    return switch (reading.quantity()) {
      case PRESSURE ->
          String.format(Locale.ROOT, "%.3f bar gauge", Unit.BAR.fromSi(reading.value()));
      default -> String.format(Locale.ROOT, "%.2f °C", Unit.CELSIUS.fromSi(reading.value()));
    };
  }
}

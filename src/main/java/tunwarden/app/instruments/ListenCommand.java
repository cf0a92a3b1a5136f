package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tunwarden.config.profile.ProfileDraft;
import tunwarden.config.profile.ProfileReader;
import tunwarden.config.profile.Profiles;
import tunwarden.serial.Listening;
import tunwarden.serial.PortException;
import tunwarden.serial.SerialLinks;
import tunwarden.units.BadInputException;

/** Shows what comes in over a port, and what the profiles make of it. */
@Command(
    name = "listen",
    description = {
      "Shows what comes in over a port and which profile fields match it.",
      "With --device, reads the port as that profile says; with --guess, proposes a profile."
    },
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments listen /dev/ttyUSB0 --baud 19200 --for '10 s'",
      "  tunwarden instruments listen COM4 --device modbus-rtu-float --address 3",
      "  tunwarden instruments listen /dev/ttyUSB0 --guess > devices/my-gauge.json"
    })
final class ListenCommand implements Callable<Integer> {
  private static final String EACH = "3 s";
  private static final String ENDLESS = "10000 d";

  @Mixin private LineOptions line;

  @Option(names = "--device", paramLabel = "PROFILE", description = "Read it by this profile.")
  private String device;

  @Option(
      names = "--address",
      paramLabel = "N",
      description = "Address of the instrument on the line, with --device. Default: 1.")
  private int address = 1;

  @Option(
      names = "--guess",
      description = "Listen at every usual speed and print a first draft of a profile.")
  private boolean guess;

  @Option(
      names = "--for",
      paramLabel = "TIME",
      description = "How long to listen; with --guess, at each speed. Default: until Ctrl-C; 3 s.")
  private String time;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() {
    PrintWriter out = spec.commandLine().getOut();
    Duration span = LineOptions.span(time != null ? time : guess ? EACH : ENDLESS);
    Path here = Path.of("");
    try {
      if (guess) {
        return guess(span);
      }
      if (device != null) {
        DeviceWatch watch = new DeviceWatch(Profiles.find(device, here), address, out);
        return watch.run(line.port(), span);
      }
      LineWatch watch = new LineWatch(Profiles.all(here).values(), out);
      return watch.run(line.port(), line.settings(), span);
    } catch (PortException e) {
      throw new BadInputException(e.getMessage(), e);
    }
  }

  private int guess(Duration each) throws PortException {
    PrintWriter err = spec.commandLine().getErr();
    Listening listening = new Listening(new SerialLinks());
    Optional<Listening.Heard> heard = listening.guess(line.port(), line.settings(), each);
    if (heard.isEmpty()) {
      err.println(
          "nothing that looks like lines of text came at any usual speed; if the instrument only"
              + " answers when asked, try 'instruments probe "
              + line.port()
              + "'");
      return 1;
    }
    String draft = ProfileDraft.of(heard.get().guess(), heard.get().line());
    ProfileReader.read(draft, "the draft");
    spec.commandLine().getOut().println(draft);
    err.println(
        heard.get().guess().certain()
            ? "a guess: check every unit, and write the true range and accuracy"
            : "no name or unit told which number is which: the first was taken for the pressure in"
                + " bar; check it against the gauge, and write the true range and accuracy");
    return 0;
  }
}

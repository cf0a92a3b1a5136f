package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tunwarden.config.profile.ProfileDraft;
import tunwarden.serial.Listening;
import tunwarden.serial.PortException;
import tunwarden.serial.SerialLinks;
import tunwarden.units.BadInputException;
import tunwarden.wire.ask.Result;
import tunwarden.wire.guess.RegisterGuess;
import tunwarden.wire.modbus.RtuQuestion;
import tunwarden.wire.modbus.RtuRequest;

/** Reads registers of a Modbus instrument and shows every way in which they can be understood. */
@Command(
    name = "probe",
    description = {
      "Shows every way to understand the registers of a Modbus instrument.",
      "Whole or floating, either word order, either byte order. It can only read."
    },
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments probe /dev/ttyUSB0 --parity EVEN --address 1 --count 4",
      "  tunwarden instruments probe COM4 --function 4 --register 100 --draft > devices/my.json"
    })
final class ProbeCommand implements Callable<Integer> {
  @Mixin private LineOptions line;

  @Option(names = "--address", paramLabel = "N", description = "Of the instrument. Default: 1.")
  private int address = 1;

  @Option(
      names = "--function",
      paramLabel = "N",
      description = "3 holding registers, 4 input registers. Default: 3.")
  private int function = 3;

  @Option(
      names = "--register",
      paramLabel = "N",
      description = "First register as on the wire, from 0. Default: 0.")
  private int register;

  @Option(names = "--count", paramLabel = "N", description = "How many registers. Default: 4.")
  private int count = 4;

  @Option(names = "--timeout", paramLabel = "TIME", description = "Default: 500 ms.")
  private String timeout = "500 ms";

  @Option(names = "--draft", description = "Print a first draft of a profile instead.")
  private boolean draft;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() {
    RtuQuestion question = new RtuQuestion(request(), List.of());
    Listening listening = new Listening(new SerialLinks());
    try {
      return tell(listening.ask(line.port(), line.settings(), question, LineOptions.span(timeout)));
    } catch (PortException e) {
      throw new BadInputException(e.getMessage(), e);
    }
  }

  private RtuRequest request() {
    if (function != 3 && function != 4) {
      throw new BadInputException("--function must be 3 or 4, the functions that read registers");
    }
    try {
      return new RtuRequest(address, function, register, count);
    } catch (IllegalArgumentException e) {
      throw new BadInputException(e.getMessage(), e);
    }
  }

  private int tell(Result result) {
    PrintWriter err = spec.commandLine().getErr();
    if (result instanceof Result.Block block) {
      show(block.data());
      return 0;
    }
    if (result instanceof Result.Refusal refusal) {
      err.println("refused: " + refusal.words());
    } else if (result instanceof Result.Failure failure) {
      err.println(failure.quality().why() + ": " + failure.detail());
    }
    return 1;
  }

  private void show(byte[] data) {
    PrintWriter out = spec.commandLine().getOut();
    if (!draft) {
      RegisterGuess.table(data, register).forEach(out::println);
      return;
    }
    boolean real = RegisterGuess.isFloat(data);
    out.println(
        ProfileDraft.ofRegisters(
            function, register, real, RegisterGuess.order(data), line.settings()));
    spec.commandLine()
        .getErr()
        .println("a guess: check every register, unit, scale, range and accuracy");
  }
}

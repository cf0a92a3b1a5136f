package tunwarden.app;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.util.List;
import java.util.stream.Collectors;
import org.slf4j.LoggerFactory;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;
import tunwarden.screen.terminal.NoTerminalException;
import tunwarden.units.BadInputException;

/** Turns whatever went wrong into one sentence on standard error and an exit code. */
final class Faults {
  static final int FAILED = 1;
  static final int WRONG_INPUT = 2;

  private Faults() {}

  /** A command line that could not be read. */
  static int usage(ParameterException fault, String[] args) {
    CommandLine line = fault.getCommandLine();
    String command = line.getCommandSpec().qualifiedName();
    line.getErr().println(sentence(fault) + " (see " + command + " --help)");
    return WRONG_INPUT;
  }

  /** A command that threw. */
  static int execution(Exception fault, CommandLine line, ParseResult parsed) {
    if (fault instanceof ParameterException usage) {
      return usage(usage, new String[0]);
    }
    if (fault instanceof BadInputException input) {
      line.getErr().println(oneLine(input.getMessage()));
      return WRONG_INPUT;
    }
    if (fault instanceof NoTerminalException none) {
      line.getErr().println(oneLine(none.getMessage()));
      return FAILED;
    }
    Throwable cause = fault instanceof UncheckedIOException ? fault.getCause() : fault;
    if (cause instanceof IOException io) {
      line.getErr().println(oneLine(describe(io)));
      return io instanceof NoSuchFileException ? WRONG_INPUT : FAILED;
    }
    LoggerFactory.getLogger(Faults.class).error("unexpected", fault);
    line.getErr()
        .println(
            "Something unforeseen went wrong ("
                + oneLine(fault.toString())
                + "); the details are in "
                + LogFile.path());
    return FAILED;
  }

  private static String sentence(ParameterException fault) {
    ArgSpec option = fault.getArgSpec();
    if (fault.getCause() instanceof BadInputException input && option instanceof OptionSpec o) {
      return o.longestName() + ": " + oneLine(input.getMessage());
    }
    if (fault instanceof UnmatchedArgumentException unmatched) {
      return unmatched(unmatched);
    }
    return oneLine(fault.getMessage());
  }

  private static String unmatched(UnmatchedArgumentException fault) {
    String what = fault.isUnknownOption() ? "There is no option '" : "There is nothing called '";
    List<String> near = fault.getSuggestions();
    String hint =
        near.isEmpty()
            ? ""
            : "; did you mean "
                + near.stream().limit(2).map(s -> "'" + s + "'").collect(Collectors.joining(" or "))
                + "?";
    return what + fault.getUnmatched().get(0) + "'" + hint;
  }

  private static String describe(IOException fault) {
    if (fault instanceof NoSuchFileException || fault instanceof FileNotFoundException) {
      return "There is no file " + fault.getMessage() + "; check the name.";
    }
    if (fault instanceof AccessDeniedException) {
      return "No permission to use " + fault.getMessage() + "; check its owner and mode.";
    }
    if (fault instanceof FileSystemException file) {
      return "Cannot use " + file.getFile() + ": " + file.getReason() + ".";
    }
    return "Reading or writing failed: " + fault.getMessage() + ".";
  }

  private static String oneLine(String text) {
    return String.valueOf(text).replaceAll("\\s*\\R\\s*", " ");
  }
}

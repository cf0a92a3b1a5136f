package tunwarden.app;

import java.io.PrintWriter;
import java.util.Locale;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Prints the manual page: the help of every command, in the roff language of man(1). */
@Command(
    name = "manual",
    description = "Prints the manual page, for man to show.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden manual > tunwarden.1 && man ./tunwarden.1",
    })
final class ManualCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    PrintWriter out = spec.commandLine().getOut();
    CommandLine all = Main.commandLine();
    out.println(".TH TUNWARDEN 1");
    out.println(".SH NAME");
    out.println(
        "tunwarden \\- watch drink kept under pressure: dissolved gas, forecast, relief margin");
    section(out, all);
  }

  private static void section(PrintWriter out, CommandLine line) {
    out.println(".SH " + line.getCommandSpec().qualifiedName().toUpperCase(Locale.ROOT));
    out.println(".nf");
    line.getUsageMessage().lines().map(ManualCommand::roff).forEach(out::println);
    out.println(".fi");
    line.getSubcommands().values().forEach(sub -> section(out, sub));
  }

  /** A line of text that roff prints as it stands. */
  static String roff(String text) {
    String escaped = text.replace("\\", "\\e").replace("-", "\\-").replace("'", "\\(aq");
    return escaped.startsWith(".") ? "\\&" + escaped : escaped;
  }
}

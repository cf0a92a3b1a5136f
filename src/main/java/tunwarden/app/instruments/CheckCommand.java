package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Locale;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.config.profile.Profiles;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;

/** Checks a device profile and shows an exchange with such an instrument. */
@Command(
    name = "check",
    description = "Checks a device profile and shows an example exchange with such an instrument.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments check devices/my-gauge.json",
      "  tunwarden instruments check text-line"
    })
final class CheckCommand implements Runnable {
  @Parameters(paramLabel = "PROFILE", description = "A file, or the name of a shipped profile.")
  private String profile;

  @Spec private CommandSpec spec;

  @Override
  public void run() {
    PrintWriter out = spec.commandLine().getOut();
    Profile read = Profiles.find(profile, Path.of(""));
    out.println(read.name() + ": " + read.title());
    out.println("speaks " + read.speaks().word() + " at " + read.line().words());
    for (Field field : read.fields().values()) {
      String low = Measure.words(field.trust().lowSi(), field);
      String high = Measure.words(field.trust().highSi(), field);
      String kind = field.kind().words();
      out.printf(Locale.ROOT, "  %-14s %s, %s to %s%n", field.name(), kind, low, high);
    }
    out.println("example exchange:");
    ExampleExchange.lines(read).forEach(line -> out.println("  " + line));
    out.println("no fault found");
  }
}

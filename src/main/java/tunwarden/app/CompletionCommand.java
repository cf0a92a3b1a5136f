package tunwarden.app;

import picocli.AutoComplete;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Prints the completion script for a shell. */
@Command(
    name = "completion",
    description = "Prints completion for bash, which zsh also takes after bashcompinit.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  bash:  source <(tunwarden completion)",
      "  zsh:   autoload -U bashcompinit; bashcompinit; source <(tunwarden completion)"
    })
final class CompletionCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    // The whole tree is asked for: the running one was built for this command alone.
    spec.commandLine().getOut().print(AutoComplete.bash(Main.NAME, Main.commandLine()));
  }
}

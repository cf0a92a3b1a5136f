package tunwarden.app.options;

import static picocli.CommandLine.Model.UsageMessageSpec.SECTION_KEY_FOOTER;
import static picocli.CommandLine.Model.UsageMessageSpec.SECTION_KEY_FOOTER_HEADING;

import java.util.List;
import picocli.CommandLine;

/**
 * Puts commands under a command line. Only the one that the arguments name is built, since reading
 * the options of all of them costs more time than most answers do; without a name all are.
 */
public final class Commands {
  private Commands() {}

  /**
   * Adds the command that is named at a place among the arguments, or all of them.
   *
   * @param line the command line to add to
   * @param entries the commands
   * @param args the whole arguments
   * @param place where the name stands
   */
  public static void add(CommandLine line, List<Entry> entries, String[] args, int place) {
    String named = place < args.length ? args[place] : "";
    boolean known = entries.stream().anyMatch(entry -> entry.name().equals(named));
    for (Entry entry : entries) {
      if (!known || entry.name().equals(named)) {
        CommandLine added = new CommandLine(entry.type());
        added.getHelpSectionMap().put(SECTION_KEY_FOOTER_HEADING, help -> "");
        added.getHelpSectionMap().put(SECTION_KEY_FOOTER, WorkedExamples::footer);
        if (added.getCommand() instanceof Group group) {
          add(added, group.members(), args, place + 1);
        }
        line.addSubcommand(added);
      }
    }
  }
}

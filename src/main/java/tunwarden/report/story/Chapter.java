package tunwarden.report.story;

import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.EventWindow;

/**
 * One vessel's part of a report.
 *
 * @param title what it is called on the page
 * @param analysis what the log says
 * @param story the same in words
 * @param belief what the liquid held
 * @param windows readings around the events worth a closer look
 * @param otherwise what would have happened, where that was asked
 * @param zone the log's own zone
 * @param origin what it was made from
 */
public record Chapter(
    String title,
    Analysis analysis,
    Story story,
    Belief belief,
    List<EventWindow> windows,
    Optional<Course> otherwise,
    ZoneId zone,
    Origin origin) {

  /**
   * What a chapter was made from.
   *
   * @param inputs the files
   * @param notes what the import guessed and counted
   * @param command the command that makes it again
   * @param program name and version of the program
   */
  public record Origin(List<Input> inputs, List<String> notes, String command, String program) {}

  /**
   * A file that went in.
   *
   * @param name as the user gave it
   * @param sha256 its SHA-256, hexadecimal
   */
  public record Input(String name, String sha256) {}

  public List<Input> inputs() {
    return origin.inputs();
  }

  public List<String> notes() {
    return origin.notes();
  }

  public String command() {
    return origin.command();
  }

  public String program() {
    return origin.program();
  }
}

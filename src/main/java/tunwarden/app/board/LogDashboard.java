package tunwarden.app.board;

import java.io.IOException;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.AlarmSettings;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.screen.model.Origin;
import tunwarden.vessel.Vessel;

/** The dashboard over a recorded log, with a survey of its events running behind. */
public final class LogDashboard {
  private LogDashboard() {}

  /**
   * Replays until the person quits.
   *
   * @param log whose head has been looked at
   * @param vessels descriptions of the vessels in it that are to be shown
   * @param alarms alarm settings
   * @param pace data seconds per real second
   * @param reportCommand command line to be quoted in a report of this log
   */
  public static void run(
      LogFile log,
      List<Vessel> vessels,
      AlarmSettings alarms,
      double pace,
      String reportCommand,
      Front front)
      throws IOException {
    try (RowSource rows = log.open()) {
      LogRow first = rows.next();
      try (Survey survey = new Survey(log, vessels, first.time())) {
        ReplayReport report = new ReplayReport(log, vessels, reportCommand);
        Playback.Helpers helpers =
            new Playback.Helpers(
                survey::start,
                () -> Optional.of(survey.last()),
                survey::marks,
                () -> report.progress().or(survey::progress),
                () -> stop(report, survey),
                report::write);
        String name = log.path().getFileName().toString();
        Playback.run(
            new Playback.Show(name, Origin.REPLAY, vessels, log, pace, alarms, Duration.ZERO),
            helpers,
            front);
      }
    }
  }

  /** Stops what is shown as progress: the report, or else the survey. */
  private static void stop(ReplayReport report, Survey survey) {
    if (!report.stop()) {
      survey.close();
    }
  }
}

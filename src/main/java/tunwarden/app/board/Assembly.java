package tunwarden.app.board;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmSettings;
import tunwarden.estimate.Estimators;
import tunwarden.forecast.whatif.Foresight;
import tunwarden.reading.Quantity;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Forecasts;
import tunwarden.station.Sink;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;
import tunwarden.vessel.Vessel;

/**
 * A station with its alarms and the board behind a dashboard, put together the same way whether the
 * samples come from instruments, a log or a rehearsal.
 *
 * @param station takes samples and ticks
 * @param alarms the alarm book
 * @param board what the dashboard draws
 */
public record Assembly(Station station, AlarmKeeper alarms, BoardKeeper board) {
  /** The futures of a vessel, from what the estimator believes. */
  public static final Forecasts FORECASTS = Foresight::outlook;

  /**
   * Puts a station together.
   *
   * @param vessels in the user's order
   * @param settings alarm settings, which also say when a reading is stale
   * @param frame what the board says beside the readings
   * @param sources where each quantity comes from
   * @param extraSinks told of every assessment after the alarms, such as a recorder
   * @param extraListeners told of what changes in the alarms
   */
  public static Assembly of(
      List<Vessel> vessels,
      AlarmSettings settings,
      BoardKeeper.Frame frame,
      BiFunction<String, Quantity, SignalSource> sources,
      List<Sink> extraSinks,
      List<AlarmKeeper.Listener> extraListeners) {
    JournalPages journal = new JournalPages();
    List<AlarmKeeper.Listener> listeners = new ArrayList<>(extraListeners);
    listeners.add(AlarmKeeper.Listener.each(journal::changed));
    AlarmKeeper alarms = new AlarmKeeper(AlarmBook.empty(settings), listeners);
    BoardKeeper board = new BoardKeeper(vessels, frame, alarms, journal, new SignalTally(sources));
    List<Sink> sinks = new ArrayList<>(List.of(alarms, board));
    sinks.addAll(extraSinks);
    StationSettings pacing = StationSettings.USUAL.withStale(settings.stale());
    Station station = new Station(vessels, Estimators.standard(), FORECASTS, pacing, sinks);
    return new Assembly(station, alarms, board);
  }
}

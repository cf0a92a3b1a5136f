package tunwarden.report.story;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.reading.Quality;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.SignalHealth;
import tunwarden.units.Constants;

/** Whether the instruments can be believed. */
final class SensorWords {
  private final Analysis analysis;
  private final Telling telling;
  private final List<String> sentences = new ArrayList<>();

  SensorWords(Analysis analysis, Telling telling) {
    this.analysis = analysis;
    this.telling = telling;
  }

  List<String> sentences() {
    Analysis.Signals signals = analysis.signals();
    sentences.add(
        String.format(
            Locale.ROOT,
            "Pressure: %s, about one every %.0f s, between %.3f and %.3f bar g; last digit worth"
                + " %.1f mbar, scatter about its course %.1f mbar.",
            Telling.count(signals.pressure().values(), "usable value"),
            signals.intervalS(),
            signals.pressure().least() / 1e5,
            signals.pressure().greatest() / 1e5,
            signals.pressureStepPa() / 100,
            signals.pressureNoisePa() / 100));
    if (signals.temperature().values() > 0) {
      sentences.add(
          String.format(
              Locale.ROOT,
              "Temperature: %s, between %.2f and %.2f °C.",
              Telling.count(signals.temperature().values(), "usable value"),
              signals.temperature().least() - Constants.ZERO_CELSIUS_K,
              signals.temperature().greatest() - Constants.ZERO_CELSIUS_K));
    } else {
      sentences.add("Temperature: no usable value, so nothing can be said about dissolved gas.");
    }
    faults("Pressure", signals.pressure());
    faults("Temperature", signals.temperature());
    events(EventKind.FROZEN);
    events(EventKind.GAP);
    events(EventKind.DRIFT);
    int spikes = analysis.events(EventKind.SPIKE).size();
    if (spikes > 0) {
      sentences.add("The pressure signal jumped and came back " + Telling.times(spikes) + ".");
    }
    return sentences;
  }

  private void faults(String name, SignalHealth health) {
    for (Map.Entry<Quality, Long> entry : health.counts().entrySet()) {
      if (entry.getKey() != Quality.GOOD) {
        sentences.add(
            name
                + ": "
                + Telling.count(entry.getValue(), "value")
                + " marked because it "
                + entry.getKey().why()
                + ".");
      }
    }
  }

  private void events(EventKind kind) {
    List<Event> events = analysis.events(kind);
    for (Event event : events.subList(0, Math.min(5, events.size()))) {
      sentences.add("From " + telling.at(event.time()) + ": " + event.why() + ".");
    }
    if (events.size() > 5) {
      sentences.add("And " + (events.size() - 5) + " more of that kind, see the timeline.");
    }
  }
}

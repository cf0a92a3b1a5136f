package tunwarden.serve;

import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Assessments;
import tunwarden.assess.Assessment;
import tunwarden.assess.Ladder;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.forecast.Caution;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.WhatIf;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalLines;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Vessel;

/** A served cellar of three vessels, one of them in trouble, and a client to ask it. */
final class ServeFixture {
  static final Instant NOW = Assessments.START.plusSeconds(30);

  final LatestState state = new LatestState();
  final EventFeed events = new EventFeed(Optional.empty());
  final List<String> ailments = new ArrayList<>();
  AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
  private final HttpClient client = HttpClient.newHttpClient();

  ServeFixture() {
    give(Assessments.of("BT1").at(0).bar(0.72).warmTo(1.1));
    give(Assessments.of(titled("FV2", "pale <b>ale</b> & \"more\"")).at(0).bar(1.31).warmTo(1.78));
    give(Assessments.of(titled("FV2", "pale <b>ale</b> & \"more\"")).at(20).bar(1.31).warmTo(1.78));
    give(Assessments.of("FV3").at(0).pressure(Quality.STALE));
    for (int i = 0; i < 3; i++) {
      state.sampled(
          Reading.good(NOW, "BT1", Quantity.PRESSURE, 0.72e5),
          new Step(Outcome.ACCEPTED, Quality.GOOD, "", null, List.of()));
    }
    for (long n = 1; n <= 5; n++) {
      events.recorded(
          List.of(
              new JournalLines.Numbered(
                  n, JournalEntry.station(NOW.plusSeconds(n), "test", "number " + n))),
          true);
    }
  }

  private static final WhatIf FAILED_SUPPLY =
      new WhatIf(
          WhatIf.Kind.SUPPLY,
          "supply fails open",
          Optional.of(new Estimate.Spread(8e5, 8e5, 8e5)),
          Optional.of(
              new TimeRange(
                  Duration.ofSeconds(14),
                  Duration.ofSeconds(11),
                  Optional.of(Duration.ofSeconds(17)))),
          "the setting of 1.50 bar g in 17 s",
          "nothing lets gas out",
          List.of(new Caution(true, "Shut the supply at its source first.")));

  private static Vessel titled(String id, String title) {
    Vessel plain = Assessments.vessel(id);
    return new Vessel(
        id,
        title,
        plain.volumeM3(),
        plain.fillM3(),
        plain.contents(),
        plain.closure(),
        plain.limits(),
        plain.orifice(),
        plain.site(),
        plain.warmToK(),
        plain.accuracy(),
        plain.prospects());
  }

  private void give(Assessments assessments) {
    Assessment bare = assessments.build();
    Assessment whole =
        new Assessment(
            bare.vessel(),
            bare.time(),
            bare.pressure(),
            bare.temperature(),
            bare.estimate(),
            bare.margins(),
            bare.outlook().with(List.of(FAILED_SUPPLY)),
            Ladder.of(bare.vessel().limits(), bare.pressure(), bare.outlook()),
            bare.events(),
            bare.notes());
    state.assessed(whole);
    book = book.fold(whole).book();
  }

  Served served() {
    return new Served(
        state,
        () -> book,
        events,
        () -> ailments,
        () -> new Served.RecorderFigures(10, 2, 1, false),
        () -> NOW);
  }

  Server server(Optional<String> token) throws IOException {
    return new Server(new InetSocketAddress(InetAddress.getLoopbackAddress(), 0), token, served());
  }

  static URI uri(Server server, String path) {
    return URI.create("http://127.0.0.1:" + server.address().getPort() + path);
  }

  HttpResponse<String> get(Server server, String path, String... headers)
      throws IOException, InterruptedException {
    HttpRequest.Builder request =
        HttpRequest.newBuilder(uri(server, path)).timeout(Duration.ofSeconds(20));
    if (headers.length > 0) {
      request.headers(headers);
    }
    return client.send(request.build(), HttpResponse.BodyHandlers.ofString());
  }
}

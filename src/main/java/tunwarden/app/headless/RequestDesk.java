package tunwarden.app.headless;

import java.io.IOException;
import java.time.Duration;
import java.time.InstantSource;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.config.Cellar;
import tunwarden.journal.Recorder;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.request.Reply;
import tunwarden.journal.request.Request;
import tunwarden.journal.request.RequestBox;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Station;
import tunwarden.station.StationLoop;

/** Takes up what people leave in the data folder, has it done, and answers once it is kept. */
final class RequestDesk {
  private static final Logger LOG = LoggerFactory.getLogger(RequestDesk.class);
  private static final Duration ANSWER_WITHIN = Duration.ofSeconds(3);

  private final RequestBox box;
  private final Recorder recorder;
  private final AlarmKeeper alarms;
  private final InstantSource clock;

  RequestDesk(Recorder recorder, Disk disk, AlarmKeeper alarms, InstantSource clock) {
    this.box = new RequestBox(disk, recorder.folder().requests());
    this.recorder = recorder;
    this.alarms = alarms;
    this.clock = clock;
  }

  /** Everything that waits, by way of the present station. */
  void serve(Cellar cellar, Station station, StationLoop loop) {
    Deeds deeds = new Deeds(alarms, station::accept, recorder::write);
    try {
      box.serve(clock.instant(), request -> carryOut(request, deeds, cellar, loop));
    } catch (IOException e) {
      LOG.warn("a request could not be answered: {}", e.toString());
    }
  }

  /** What a person asks for is done on the station's thread; the answer is waited for here. */
  private Reply carryOut(Request request, Deeds deeds, Cellar cellar, StationLoop loop) {
    CompletableFuture<Reply> reply = new CompletableFuture<>();
    boolean taken =
        loop.submit(() -> reply.complete(deeds.carryOut(request, cellar, clock.instant())));
    if (!taken) {
      return Reply.refused("the program is too busy; ask again");
    }
    try {
      Reply said = reply.get(ANSWER_WITHIN.toMillis(), TimeUnit.MILLISECONDS);
      return recorder.settle(ANSWER_WITHIN)
          ? said
          : new Reply(said.done(), said.text() + " (not on the disk yet: it refuses)");
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return Reply.refused("the program is ending");
    } catch (ExecutionException | TimeoutException e) {
      return Reply.refused("the program did not come to it in time; look before asking again");
    }
  }
}

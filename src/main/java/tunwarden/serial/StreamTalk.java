package tunwarden.serial;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import tunwarden.reading.Quality;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.text.Garble;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;
import tunwarden.wire.text.Printable;

/** Listens to instruments that send lines unasked. */
final class StreamTalk implements Talk {
  private static final int WAIT_MS = 100;
  private static final int DETAIL = 60;

  private final Desk desk;
  private final List<Ear> ears = new ArrayList<>();
  private final byte[] buffer = new byte[1024];
  private final char end;
  private LineFramer framer;
  private Garble garble;
  private long droppedBefore;
  private long longBefore;

  /** One profile on the line with what is bound to it. */
  private record Ear(LineReader reader, List<Binding> bindings) {}

  StreamTalk(PortPlan plan, Desk desk) {
    this.desk = desk;
    this.end = plan.bindings().get(0).profile().framing().end();
    for (Profile profile : plan.bindings().stream().map(Binding::profile).distinct().toList()) {
      List<Binding> own =
          plan.bindings().stream().filter(b -> b.profile().equals(profile)).toList();
      ears.add(new Ear(new LineReader(profile), own));
    }
    begin();
  }

  @Override
  public void begin() {
    framer = new LineFramer(end, false);
    garble = new Garble(end);
    droppedBefore = 0;
    longBefore = 0;
  }

  @Override
  public void turn(ByteLink link) throws PortException {
    int count = link.read(buffer, WAIT_MS);
    if (count == 0) {
      return;
    }
    Instant now = desk.now();
    desk.tally().received(buffer, count, now);
    garble.accept(buffer, count);
    for (String line : framer.accept(buffer, count)) {
      heard(line, now);
    }
    countDropped(now);
  }

  private void countDropped(Instant now) {
    desk.tally().dropped(framer.bytesDropped() - droppedBefore);
    droppedBefore = framer.bytesDropped();
    if (framer.linesDropped() > longBefore) {
      longBefore = framer.linesDropped();
      desk.tally().trouble(Trouble.TOO_LONG, "over " + LineFramer.CAP + " bytes", now);
    }
  }

  private void heard(String line, Instant now) {
    boolean damaged = false;
    for (Ear ear : ears) {
      LineReader.Line read = ear.reader().read(line, "");
      switch (read.verdict()) {
        case UNDERSTOOD -> {
          garble.understood();
          desk.values(read.values(), ear.bindings());
          return;
        }
        case DAMAGED -> damaged = true;
        case FOREIGN -> {}
        default -> throw new IllegalStateException(read.verdict().name());
      }
    }
    garble.strangeLine();
    desk.tally().dropped(line.length());
    Trouble trouble = damaged ? Trouble.CHECKSUM : Trouble.FOREIGN;
    desk.tally().trouble(trouble, "'" + Printable.of(line, DETAIL) + "'", now);
    if (damaged) {
      for (Ear ear : ears) {
        desk.faults(ear.bindings(), Quality.CHECKSUM, Printable.of(line, DETAIL));
      }
    }
  }

  @Override
  public LinkState state() {
    return switch (garble.verdict()) {
      case FINE -> LinkState.OPEN;
      case GARBLED -> LinkState.GARBLED;
      case ENDLESS -> LinkState.ENDLESS;
      case FOREIGN -> LinkState.FOREIGN;
    };
  }
}

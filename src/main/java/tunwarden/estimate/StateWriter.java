package tunwarden.estimate;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.List;
import tunwarden.estimate.bank.Noise;
import tunwarden.estimate.gate.Track;

/** Writes the parts of a state; the mirror of {@link StateReader}. */
final class StateWriter {
  private static final int LONGEST_TEXT = 600;

  private final ByteBuffer out;

  StateWriter(ByteBuffer out) {
    this.out = out;
  }

  void flag(boolean value) {
    out.put((byte) (value ? 1 : 0));
  }

  void numbers(double... values) {
    for (double value : values) {
      out.putDouble(value);
    }
  }

  void text(String text) {
    String kept = text.length() > LONGEST_TEXT ? text.substring(0, LONGEST_TEXT) : text;
    byte[] bytes = kept.getBytes(StandardCharsets.UTF_8);
    out.putInt(bytes.length).put(bytes);
  }

  void instant(Instant time) {
    out.putLong(time.getEpochSecond()).putInt(time.getNano());
  }

  void track(Track t) {
    flag(t.seen());
    out.putLong(t.timeMs());
    numbers(t.value(), t.earlier(), t.restless());
    out.putInt(t.sameRun()).putLong(t.sameSinceMs()).putLong(t.strayMs());
    numbers(t.strayValue());
    out.putInt(t.strays());
  }

  void senses(Senses s) {
    track(s.pressure());
    track(s.temperature());
    track(s.barometer());
    numbers(s.smoothK(), s.smoothS(), s.slowK());
    Noise n = s.noise();
    out.putInt(n.count()).putInt(n.run());
    numbers(n.last(), n.before(), n.scatter(), n.step());
  }

  void watch(Watch w) {
    numbers(w.coolestK(), w.coolestS(), w.warmestK(), w.warmestS());
    numbers(w.strainS(), w.lossS(), w.lostKgPerM3(), w.saidS());
    text(w.said());
  }

  void book(EventBook book) {
    List<Event> events = book.list();
    out.putInt(events.size());
    for (Event e : events) {
      out.putInt(e.kind().ordinal());
      text(e.vessel());
      instant(e.time());
      instant(e.until());
      flag(e.open());
      numbers(e.fromPaGauge(), e.toPaGauge(), e.gasKg(), e.confidence());
      text(e.why());
    }
  }

  void point(Front.Point point) {
    flag(point != null);
    if (point != null) {
      numbers(point.atS(), point.paGauge());
    }
  }

  void front(Front f) {
    numbers(f.bankS(), f.sumPa(), f.intervalS(), f.flowS());
    out.putInt(f.count());
    point(f.last());
    point(f.doubt());
    flag(f.flow() != null);
    if (f.flow() != null) {
      point(f.flow().begin());
      point(f.flow().first());
      point(f.flow().moving());
      out.putInt(f.flow().quiet());
    }
  }

  void estimate(Estimate e) {
    instant(e.at());
    numbers(e.pressurePaGauge(), e.temperatureK(), e.dissolvedKgPerM3());
    numbers(e.dissolvedU95KgPerM3(), e.equilibriumKgPerM3(), e.settled());
    numbers(e.airFraction(), e.airFractionU95());
    out.putInt(e.mode().ordinal());
    numbers(e.modeConfidence());
    numbers(e.transferPerS().low(), e.transferPerS().middle(), e.transferPerS().high());
    numbers(e.gasMadeKgPerM3PerS());
    text(e.ignorance());
  }
}

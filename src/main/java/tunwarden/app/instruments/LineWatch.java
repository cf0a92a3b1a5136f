package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import tunwarden.serial.ByteLink;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.PortException;
import tunwarden.serial.SerialLinks;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.text.Garble;
import tunwarden.wire.text.LineFramer;
import tunwarden.wire.text.LineReader;
import tunwarden.wire.text.Printable;

/** Prints every line that comes in, and what each streaming profile reads in it. */
final class LineWatch {
  private static final int SHOWN = 160;

  private final List<Profile> profiles;
  private final PrintWriter out;
  private final Garble garble = new Garble('\n');
  private Garble.Verdict said = Garble.Verdict.FINE;
  private long bytes;

  LineWatch(Collection<Profile> profiles, PrintWriter out) {
    this.profiles = profiles.stream().filter(p -> p.speaks() == Speaks.TEXT_LINES).toList();
    this.out = out;
  }

  /** Listens for a time; 0 when anything came in. */
  int run(String port, LineSettings settings, Duration span) throws PortException {
    byte[] buffer = new byte[512];
    LineFramer framer = new LineFramer('\n', false);
    long end = System.nanoTime() + span.toNanos();
    try (ByteLink link = new SerialLinks().open(port, settings, ByteLinkFactory.Use.LISTEN)) {
      out.println("listening on " + port + " at " + settings.words());
      out.flush();
      while (System.nanoTime() - end < 0) {
        int count = link.read(buffer, 100);
        bytes += count;
        garble.accept(buffer, count);
        framer.accept(buffer, count).forEach(this::show);
        warn(Printable.of(buffer, count, SHOWN));
        out.flush();
      }
    }
    out.println(bytes == 0 ? "nothing came in" : bytes + " bytes came in");
    return bytes == 0 ? 1 : 0;
  }

  private void show(String line) {
    out.println(Printable.of(line, SHOWN));
    List<String> readers = new ArrayList<>();
    for (Profile profile : profiles) {
      LineReader.Line read = new LineReader(profile).read(line, "");
      if (read.verdict() == LineReader.Verdict.UNDERSTOOD) {
        readers.add("    " + profile.name() + ": " + ExampleExchange.words(profile, read.values()));
      }
    }
    if (readers.isEmpty()) {
      out.println("    no profile reads this line");
    } else {
      garble.understood();
      readers.forEach(out::println);
    }
  }

  private void warn(String last) {
    Garble.Verdict verdict = garble.verdict();
    if (verdict != said && verdict == Garble.Verdict.GARBLED) {
      out.println(
          "this is no text: is the baud rate right? try another --baud, or --guess: " + last);
    }
    if (verdict != said && verdict == Garble.Verdict.ENDLESS) {
      out.println("text without line ends: " + last);
    }
    said = verdict;
  }
}

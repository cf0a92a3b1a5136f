package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.time.Duration;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import tunwarden.reading.Fault;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.LinkHealth;
import tunwarden.serial.PortException;
import tunwarden.serial.PortPlan;
import tunwarden.serial.PortRunner;
import tunwarden.serial.SerialLinks;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.Speaks;
import tunwarden.wire.signal.Calibration;

/** Reads a port by one profile and prints every value; the field's name stands for the vessel. */
final class DeviceWatch {
  private static final int QUEUE = 10_000;
  private static final Map<Kind, Quantity> QUANTITIES =
      Map.of(
          Kind.TEMPERATURE, Quantity.TEMPERATURE,
          Kind.VOLUME, Quantity.LEVEL,
          Kind.EXTRACT, Quantity.GRAVITY,
          Kind.GAS_CONTENT, Quantity.DISSOLVED);

  private final Profile profile;
  private final int address;
  private final PrintWriter out;
  private long values;

  DeviceWatch(Profile profile, int address, PrintWriter out) {
    this.profile = profile;
    this.address = profile.speaks() == Speaks.TEXT_LINES ? 0 : address;
    this.out = out;
  }

  /** Reads for a time; 0 when any value came in. A port that cannot be opened ends it at once. */
  int run(String port, Duration span) throws PortException {
    SerialLinks links = new SerialLinks();
    links.open(port, profile.line(), ByteLinkFactory.Use.ASK).close();
    BlockingQueue<Sample> samples = new LinkedBlockingQueue<>(QUEUE);
    PortPlan plan = new PortPlan(port, bindings());
    long end = System.nanoTime() + span.toNanos();
    try (PortRunner runner = new PortRunner(plan, links, samples::offer, InstantSource.system())) {
      runner.start();
      String state = "";
      while (System.nanoTime() - end < 0) {
        print(next(samples));
        String now = runner.health().state().words();
        if (!now.equals(state)) {
          out.println("-- " + port + " " + now);
          state = now;
        }
        out.flush();
      }
      summary(runner.health().traffic());
    }
    return values > 0 ? 0 : 1;
  }

  private static Sample next(BlockingQueue<Sample> samples) {
    try {
      return samples.poll(100, TimeUnit.MILLISECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return null;
    }
  }

  private void print(Sample sample) {
    if (sample instanceof Reading reading) {
      values++;
      Field field = profile.field(reading.vessel()).orElseThrow();
      String shown = Measure.words(reading.value(), field);
      out.println(reading.time() + "  " + field.name() + "  " + shown);
    } else if (sample instanceof Fault fault) {
      String detail = fault.detail().isEmpty() ? "" : " (" + fault.detail() + ")";
      String why = fault.quality().why() + detail;
      out.println(fault.time() + "  " + fault.vessel() + "  BAD: " + why);
    }
  }

  private void summary(LinkHealth.Traffic traffic) {
    out.println(traffic.messages() + " messages, " + traffic.bytes() + " bytes");
    out.println("last bytes: " + traffic.lastBytes());
    traffic.troubles().forEach((trouble, count) -> out.println(count + " x " + trouble.words()));
  }

  private List<Binding> bindings() {
    List<Binding> bindings = new ArrayList<>();
    Duration period = profile.polling().period();
    for (Field field : profile.fields().values()) {
      Binding.Trim trim = new Binding.Trim(Calibration.NONE, 0, period, field.trust().u95Si());
      bindings.add(new Binding(field.name(), quantity(field), profile, field, address, trim));
    }
    return bindings;
  }

  /** A pressure is shown as the instrument counts it. */
  private static Quantity quantity(Field field) {
    if (field.kind() != Kind.PRESSURE) {
      return QUANTITIES.get(field.kind());
    }
    return field.reference() == Pressure.Reference.GAUGE ? Quantity.PRESSURE : Quantity.BAROMETER;
  }
}

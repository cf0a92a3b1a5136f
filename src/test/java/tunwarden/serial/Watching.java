package tunwarden.serial;

import java.time.InstantSource;
import java.util.ArrayList;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.function.Predicate;
import tunwarden.reading.Fault;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.units.Kind;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.signal.Calibration;

/** A runner over a port with everything it hands on kept. */
final class Watching implements AutoCloseable {
  private final Queue<Sample> samples = new ConcurrentLinkedQueue<>();
  private final PortRunner runner;

  Watching(String port, List<Binding> bindings) {
    PortPlan plan = new PortPlan(port, bindings);
    runner = new PortRunner(plan, new SerialLinks(), samples::add, InstantSource.system());
    runner.start();
  }

  /** Pressure and temperature of one unit, put to a vessel named after it. */
  static List<Binding> unit(Profile profile, int slave) {
    List<Binding> bindings = new ArrayList<>();
    Binding.Trim trim = new Binding.Trim(Calibration.NONE, 100_000, profile.polling().period(), 1);
    for (Field field : profile.fields().values()) {
      Quantity quantity = field.kind() == Kind.PRESSURE ? Quantity.PRESSURE : Quantity.TEMPERATURE;
      bindings.add(new Binding("unit" + slave, quantity, profile, field, slave, trim));
    }
    return bindings;
  }

  LinkHealth health() {
    return runner.health();
  }

  List<Reading> readings(Predicate<Reading> wanted) {
    List<Reading> found = new ArrayList<>();
    for (Sample sample : samples) {
      if (sample instanceof Reading reading && wanted.test(reading)) {
        found.add(reading);
      }
    }
    return found;
  }

  List<Fault> faults() {
    List<Fault> found = new ArrayList<>();
    for (Sample sample : samples) {
      if (sample instanceof Fault fault) {
        found.add(fault);
      }
    }
    return found;
  }

  @Override
  public void close() {
    runner.close();
  }
}

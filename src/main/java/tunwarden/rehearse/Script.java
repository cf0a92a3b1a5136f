package tunwarden.rehearse;

import java.time.Duration;
import java.util.Optional;
import java.util.Random;
import java.util.TreeMap;
import tunwarden.vessel.Vessel;

/** One rehearsed vessel: what its user would write down, what it truly is, and what befalls it. */
final class Script {
  /** Draws a script from a seeded source. */
  interface Maker {
    Script make(Random random);
  }

  /** What happens at every second, given the seconds since the start. */
  interface Course {
    void at(double seconds, SimulatedVessel vessel, Sensors sensors);
  }

  /**
   * The instruments on the vessel.
   *
   * @param pressure shows bar
   * @param temperature shows °C
   */
  record Sensors(SimulatedSensor pressure, SimulatedSensor temperature) {}

  private final Vessel described;
  private final SimulatedVessel vessel;
  private final Sensors sensors;
  private final Duration length;
  private final Duration interval;
  private final Course course;
  private final TreeMap<Long, String> remarks = new TreeMap<>();

  Script(
      Vessel described,
      SimulatedVessel vessel,
      Sensors sensors,
      Duration length,
      Duration interval,
      Course course) {
    this.described = described;
    this.vessel = vessel;
    this.sensors = sensors;
    this.length = length;
    this.interval = interval;
    this.course = course;
  }

  /** Has the log carry a remark at a time. */
  Script remark(double seconds, String text) {
    remarks.put((long) seconds, text);
    return this;
  }

  /** The vessel as its user describes it. */
  Vessel described() {
    return described;
  }

  SimulatedVessel vessel() {
    return vessel;
  }

  Sensors sensors() {
    return sensors;
  }

  /** Length of the log that is usually made of it. */
  Duration length() {
    return length;
  }

  /** Time between its rows. */
  Duration interval() {
    return interval;
  }

  /** Lets one second pass. */
  void second(long second) {
    course.at(second, vessel, sensors);
    vessel.advance(1);
  }

  /** What is remarked in the stretch ending at {@code until}. */
  Optional<String> remarkWithin(long after, long until) {
    return remarks.subMap(after, false, until, true).values().stream()
        .reduce((a, b) -> a + "; " + b);
  }
}

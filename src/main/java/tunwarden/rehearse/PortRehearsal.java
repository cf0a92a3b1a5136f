package tunwarden.rehearse;

import java.time.Duration;
import java.time.Instant;
import java.util.HashMap;
import java.util.Map;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;
import tunwarden.serial.ByteLink;
import tunwarden.serial.ByteLinkFactory;
import tunwarden.serial.PortException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.simulate.PlayedInstrument;

/**
 * Plays the instruments of a rehearsed vessel on a serial port, in the language of a device
 * profile, so that a cellar can be set up and people trained before the instruments arrive.
 * Whatever listens must be on the other end of a null-modem cable or a pair of virtual ports.
 */
public final class PortRehearsal {
  private static final double BAROMETER_AT_MOST_PA = 130_000;
  private static final int WAIT_MS = 20;

  private final Rehearsal rehearsal;
  private final Stage stage;
  private final PlayedInstrument instrument;
  private final double ambientPa;
  private LogRow row;

  /**
   * Where and how it is played.
   *
   * @param port name of the serial port
   * @param profile how the instrument speaks
   * @param address its address on the line; of no meaning for one that speaks unasked
   * @param pace seconds of the vessel in one second of the clock
   */
  public record Stage(String port, Profile profile, int address, double pace) {}

  /**
   * A rehearsal on a port.
   *
   * @param rehearsal the vessel, from its beginning
   * @param stage where it is played
   * @param ambientPa the atmosphere, Pa absolute, for instruments that measure absolute pressure
   */
  public PortRehearsal(Rehearsal rehearsal, Stage stage, double ambientPa) {
    this.rehearsal = rehearsal;
    this.stage = stage;
    this.ambientPa = ambientPa;
    this.instrument = PlayedInstrument.of(stage.profile(), stage.address());
    this.row = rehearsal.next();
  }

  /**
   * Plays until told to stop or the port goes.
   *
   * @param links opens the port
   * @param goesOn asked many times a second
   * @param shown told each row as it is put on the instrument
   * @throws PortException when the port cannot be opened, or has gone
   */
  public void play(ByteLinkFactory links, BooleanSupplier goesOn, Consumer<LogRow> shown)
      throws PortException {
    byte[] buffer = new byte[256];
    Instant first = row.time();
    long start = System.nanoTime();
    long period = stage.profile().polling().period().toNanos();
    long nextWord = start;
    try (ByteLink link =
        links.open(stage.port(), stage.profile().line(), ByteLinkFactory.Use.ASK)) {
      while (goesOn.getAsBoolean() && row != null) {
        long now = System.nanoTime();
        advance(first.plus(Duration.ofNanos((long) ((now - start) * stage.pace()))), shown);
        int count = link.read(buffer, WAIT_MS);
        say(link, instrument.hear(buffer, count));
        if (now - nextWord >= 0) {
          say(link, instrument.speak());
          nextWord += period;
        }
      }
    }
  }

  private static void say(ByteLink link, byte[] bytes) throws PortException {
    if (bytes.length > 0) {
      link.write(bytes);
    }
  }

  private void advance(Instant until, Consumer<LogRow> shown) {
    LogRow latest = null;
    while (row != null && !row.time().isAfter(until)) {
      latest = row;
      row = rehearsal.next();
    }
    if (latest != null) {
      instrument.show(fields(latest));
      shown.accept(latest);
    }
  }

  private Map<String, Double> fields(LogRow latest) {
    Map<String, Double> fields = new HashMap<>();
    for (Field field : stage.profile().fields().values()) {
      for (Sample sample : latest.samples()) {
        if (sample instanceof Reading reading && shows(field, reading.quantity())) {
          fields.put(field.name(), counted(field, reading.value()));
        }
      }
    }
    return fields;
  }

  private static boolean shows(Field field, Quantity quantity) {
    return field.kind() == quantity.kind();
  }

  /** An absolute gauge whose range ends near the atmosphere is taken for a barometer. */
  private double counted(Field field, double si) {
    boolean absolute =
        field.kind() == Kind.PRESSURE && field.reference() == Pressure.Reference.ABSOLUTE;
    if (!absolute) {
      return si;
    }
    return field.trust().highSi() <= BAROMETER_AT_MOST_PA ? ambientPa : si + ambientPa;
  }
}

package tunwarden.wire.simulate;

import java.util.Map;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.modbus.Registers;
import tunwarden.wire.modbus.RtuRequest;
import tunwarden.wire.modbus.RtuServer;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Place;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.profile.RawType;
import tunwarden.wire.signal.CurrentLoop;
import tunwarden.wire.signal.ResistanceThermometer;

/** Plays an instrument that answers Modbus read requests. */
final class PlayedRegisters implements PlayedInstrument {
  private static final byte[] NOTHING = {};
  private static final double FAILED_LOOP_MA = 3.5;
  private static final double BROKEN_OHM = 600;

  private final Profile profile;
  private final RtuServer server;
  private Map<String, Double> values = Map.of();

  PlayedRegisters(Profile profile, int slave) {
    this.profile = profile;
    this.server = new RtuServer(slave, this::data);
  }

  @Override
  public void show(Map<String, Double> next) {
    values = Map.copyOf(next);
  }

  @Override
  public byte[] speak() {
    return NOTHING;
  }

  @Override
  public byte[] hear(byte[] bytes, int count) {
    return server.hear(bytes, count);
  }

  /** The data asked for; null when no field stands in the block. */
  private byte[] data(RtuRequest request) {
    byte[] data = new byte[request.dataBytes()];
    boolean any = false;
    for (Field field : profile.fields().values()) {
      Place.Register place = (Place.Register) field.place();
      int offset = place.address() - request.address();
      boolean inside = offset >= 0 && offset + place.type().registers() <= request.count();
      if (place.function() != request.function() || !inside) {
        continue;
      }
      any = true;
      if (place.type() == RawType.BIT) {
        data[offset / 8] |= (byte) (raw(field) != 0 ? 1 << offset % 8 : 0);
      } else {
        Registers.write(data, 2 * offset, raw(field), place.type(), place.words());
      }
    }
    return any ? data : null;
  }

  private double raw(Field field) {
    Double si = values.get(field.name());
    if (si != null && Double.isFinite(si)) {
      return Measure.raw(si, field);
    }
    Field.Number number = field.number();
    if (!number.faultNumbers().isEmpty()) {
      return number.faultNumbers().get(0);
    }
    RawType type = ((Place.Register) field.place()).type();
    boolean real = type == RawType.FLOAT32 || type == RawType.FLOAT64;
    double signal = real ? Double.NaN : Double.MAX_VALUE;
    if (field.conversion() instanceof CurrentLoop) {
      signal = FAILED_LOOP_MA;
    } else if (field.conversion() instanceof ResistanceThermometer) {
      signal = BROKEN_OHM;
    }
    return (signal - number.offset()) / number.scale();
  }
}

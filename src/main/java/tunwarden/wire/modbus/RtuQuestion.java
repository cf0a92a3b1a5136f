package tunwarden.wire.modbus;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.profile.Field;
import tunwarden.wire.profile.Place;
import tunwarden.wire.profile.RawType;
import tunwarden.wire.signal.Decoded;

/**
 * One block of registers of one instrument, and the fields that stand in it.
 *
 * @param request what is sent
 * @param fields the fields that lie wholly within the block; none to be given the bare data
 */
public record RtuQuestion(RtuRequest request, List<Field> fields) implements Question {
  private static final int FRAME = 5;

  @Override
  public byte[] bytes() {
    return request.bytes();
  }

  @Override
  public int answerBytes() {
    return FRAME + request.dataBytes();
  }

  @Override
  public Ear listen() {
    RtuAnswer answer = new RtuAnswer(request);
    return new Ear() {
      @Override
      public Result accept(byte[] bytes, int count) {
        RtuAnswer.Found found = answer.accept(bytes, count);
        if (found == null) {
          return null;
        }
        if (found.data() == null) {
          return Refusals.of(found.code(), request.unit());
        }
        return fields.isEmpty()
            ? new Result.Block(found.data())
            : new Result.Values(values(found.data()));
      }

      @Override
      public Result.Failure late() {
        return answer.late();
      }
    };
  }

  private Map<String, Decoded> values(byte[] data) {
    Map<String, Decoded> values = new LinkedHashMap<>();
    for (Field field : fields) {
      values.put(field.name(), Measure.judge(raw(data, (Place.Register) field.place()), field));
    }
    return values;
  }

  private double raw(byte[] data, Place.Register place) {
    int offset = place.address() - request.address();
    if (place.type() == RawType.BIT) {
      return data[offset / 8] >> offset % 8 & 1;
    }
    return Registers.read(data, 2 * offset, place.type(), place.words());
  }
}

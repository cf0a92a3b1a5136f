package tunwarden.wire.modbus;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;

import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.forecast.ReferenceRows;
import tunwarden.reading.Quality;
import tunwarden.wire.profile.RawType;
import tunwarden.wire.profile.WordOrder;

/** Frames of Modbus RTU, byte by byte. */
class RtuTest {
  private static final byte[] PRESSURE = {0x3F, (byte) 0x80, 0x00, 0x00};

  private static byte[] answer(int unit, int function, byte... data) {
    byte[] frame = new byte[5 + data.length];
    frame[0] = (byte) unit;
    frame[1] = (byte) function;
    frame[2] = (byte) data.length;
    System.arraycopy(data, 0, frame, 3, data.length);
    return RtuRequest.sealed(frame);
  }

  @Test
  void aRequestIsThePublishedFrame() {
    // 01 03 00 00 00 0A C5 CD: seen in many public tests
    byte[] expected = {1, 3, 0, 0, 0, 0x0A, (byte) 0xC5, (byte) 0xCD};
    assertArrayEquals(expected, new RtuRequest(1, 3, 0, 10).bytes());
  }

  @ParameterizedTest
  @CsvSource({
    "0,3,0,1",
    "248,3,0,1",
    "1,5,0,1",
    "1,6,0,1",
    "1,16,0,1",
    "1,0,0,1",
    "1,3,-1,1",
    "1,3,65535,2",
    "1,3,70000,1",
    "1,3,0,0",
    "1,3,0,126",
    "1,1,0,2001"
  })
  void whatTheStandardHasNoRoomForAndAnythingThatWritesIsRefused(
      int unit, int function, int address, int count) {
    assertThrows(
        IllegalArgumentException.class, () -> new RtuRequest(unit, function, address, count));
  }

  @Test
  void anAnswerIsFoundAtEveryChunkSizeBehindNoise() {
    byte[] frame = answer(1, 3, PRESSURE);
    for (int noise = 0; noise <= 40; noise++) {
      byte[] stream = new byte[noise + frame.length];
      Arrays.fill(stream, 0, noise, (byte) 1);
      System.arraycopy(frame, 0, stream, noise, frame.length);
      for (int piece = 1; piece <= stream.length; piece++) {
        RtuAnswer answer = new RtuAnswer(new RtuRequest(1, 3, 0, 2));
        RtuAnswer.Found found = null;
        for (int from = 0; from < stream.length && found == null; from += piece) {
          byte[] part = Arrays.copyOfRange(stream, from, Math.min(stream.length, from + piece));
          found = answer.accept(part, part.length);
        }
        assertArrayEquals(PRESSURE, found.data());
      }
    }
  }

  @ParameterizedTest
  @CsvSource({"2,3", "1,4", "1,131"})
  void anAnswerOfAnotherUnitOrFunctionIsNotTaken(int unit, int function) {
    byte[] frame = answer(unit, function, PRESSURE);
    RtuAnswer answer = new RtuAnswer(new RtuRequest(1, 3, 0, 2));
    assertNull(answer.accept(frame, frame.length));
    assertEquals(Quality.UNREADABLE, answer.late().quality());
  }

  @Test
  void anAnswerOfAnotherLengthIsNotTaken() {
    byte[] frame = answer(1, 3, (byte) 0, (byte) 1);
    RtuAnswer answer = new RtuAnswer(new RtuRequest(1, 3, 0, 2));
    assertNull(answer.accept(frame, frame.length));
  }

  @Test
  void everySingleBitErrorIsCaught() {
    byte[] frame = answer(1, 3, PRESSURE);
    for (int bit = 0; bit < 8 * frame.length; bit++) {
      byte[] damaged = frame.clone();
      damaged[bit / 8] ^= (byte) (1 << bit % 8);
      assertNull(new RtuAnswer(new RtuRequest(1, 3, 0, 2)).accept(damaged, damaged.length));
    }
  }

  @Test
  void exceptionCodesAreSaidInTheWordsOfTheStandard() {
    // modbus_exceptions.csv: all seen in several public protocol libraries
    for (NamedCsvRecord row : ReferenceRows.of("modbus_exceptions")) {
      int code = Integer.parseInt(row.getField("code_hex"), 16);
      byte[] frame = RtuRequest.sealed(new byte[] {9, (byte) 0x83, (byte) code, 0, 0});
      RtuAnswer.Found found = new RtuAnswer(new RtuRequest(9, 3, 0, 2)).accept(frame, frame.length);
      assertEquals(code, found.code());
      String words = Refusals.of(code, 9).words();
      assertEquals("unit 9: " + row.getField("name"), words.replace(", still working", ""));
    }
    assertEquals("unit 9: unknown exception 63", Refusals.of(0x63, 9).words());
  }

  @ParameterizedTest
  @EnumSource(WordOrder.class)
  void numbersComeBackInEveryWordOrder(WordOrder order) {
    byte[] data = new byte[12];
    for (RawType type : RawType.values()) {
      double number = type == RawType.BIT ? 1 : type.name().startsWith("U") ? 40_000 : -12_345;
      if (type == RawType.BIT) {
        continue;
      }
      Registers.write(data, 2, number, type, order);
      assertEquals(number, Registers.read(data, 2, type, order), type::word);
    }
  }

  @Test
  void wordOrdersNameTheBytesAsTheyArrive() {
    // 1.0f is 3F 80 00 00
    byte[][] arriving = {
      {0x3F, (byte) 0x80, 0, 0}, {0, 0, 0x3F, (byte) 0x80},
      {(byte) 0x80, 0x3F, 0, 0}, {0, 0, (byte) 0x80, 0x3F}
    };
    for (int i = 0; i < arriving.length; i++) {
      WordOrder order = WordOrder.values()[i];
      assertEquals(1, Registers.read(arriving[i], 0, RawType.FLOAT32, order), order::word);
    }
  }
}

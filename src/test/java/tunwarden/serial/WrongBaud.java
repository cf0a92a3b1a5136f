package tunwarden.serial;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * What a receiver hears when it samples a line at another speed than it was sent at: the levels on
 * the wire are drawn out bit by bit (8N1), then sampled in the middle of the receiver's bits.
 */
final class WrongBaud {
  private WrongBaud() {}

  static byte[] heardAt(int receiverBaud, int senderBaud, String text) {
    List<Boolean> levels = new ArrayList<>();
    for (byte b : text.getBytes(StandardCharsets.ISO_8859_1)) {
      levels.add(false);
      for (int bit = 0; bit < 8; bit++) {
        levels.add((b >> bit & 1) == 1);
      }
      levels.add(true);
    }
    ByteArrayOutputStream heard = new ByteArrayOutputStream();
    double step = (double) senderBaud / receiverBaud;
    double position = 0;
    while (position < levels.size()) {
      if (level(levels, position)) {
        position += step / 16;
        continue;
      }
      int value = 0;
      for (int bit = 0; bit < 8; bit++) {
        value |= level(levels, position + step * (1.5 + bit)) ? 1 << bit : 0;
      }
      // a missing stop bit is a framing error, which an ignoring driver passes on as it came
      heard.write(value);
      position += step * 9.5;
    }
    return heard.toByteArray();
  }

  private static boolean level(List<Boolean> levels, double position) {
    int index = (int) position;
    return index >= levels.size() || levels.get(index);
  }
}

package tunwarden.screen.terminal;

import com.googlecode.lanterna.input.KeyStroke;
import tunwarden.screen.model.Key;

/** From the terminal library's key strokes to ours. */
final class Keys {
  private Keys() {}

  static Key of(KeyStroke stroke) {
    return switch (stroke.getKeyType()) {
      case Character -> typed(stroke);
      case ArrowUp -> Key.of(Key.Kind.UP);
      case ArrowDown -> Key.of(Key.Kind.DOWN);
      case ArrowLeft -> Key.of(Key.Kind.LEFT);
      case ArrowRight -> Key.of(Key.Kind.RIGHT);
      case PageUp -> Key.of(Key.Kind.PAGE_UP);
      case PageDown -> Key.of(Key.Kind.PAGE_DOWN);
      case Home -> Key.of(Key.Kind.HOME);
      case End -> Key.of(Key.Kind.END);
      case Enter -> Key.of(Key.Kind.ENTER);
      case Escape -> Key.of(Key.Kind.ESCAPE);
      case Backspace, Delete -> Key.of(Key.Kind.BACKSPACE);
      case Tab -> Key.of(Key.Kind.TAB);
      default -> Key.of(Key.Kind.OTHER);
    };
  }

  private static Key typed(KeyStroke stroke) {
    char c = stroke.getCharacter();
    if (stroke.isCtrlDown()) {
      return switch (Character.toLowerCase(c)) {
        case 'c' -> Key.of(Key.Kind.INTERRUPT);
        case 'l' -> Key.of(Key.Kind.REPAINT);
        default -> Key.of(Key.Kind.OTHER);
      };
    }
    return stroke.isAltDown() ? Key.of(Key.Kind.OTHER) : Key.typed(c);
  }
}

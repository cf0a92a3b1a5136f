package tunwarden.screen;

import java.util.List;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Request;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Turn;
import tunwarden.screen.model.Update;
import tunwarden.screen.view.ScreenView;

/** A scripted session without a terminal: keys in, screens and requests out. */
final class Sessions {
  private final RecordingDesk desk = new RecordingDesk();
  private Model model;

  Sessions(Board board, Size size) {
    model = Model.start(board, Look.USUAL, size);
  }

  Model model() {
    return model;
  }

  List<String> asked() {
    return desk.asked();
  }

  /** The screen as text. */
  String screen() {
    return ScreenView.draw(model).text();
  }

  Sessions board(Board board) {
    model = model.withBoard(board);
    return this;
  }

  /** Types every character of a text. */
  Sessions type(String text) {
    text.codePoints().forEach(c -> press(Key.typed(c)));
    return this;
  }

  Sessions press(Key.Kind kind) {
    return press(Key.of(kind));
  }

  Sessions press(Key key) {
    Turn turn = Update.key(model, key);
    model = turn.model();
    for (Request request : turn.requests()) {
      String said = request.of(desk);
      model = said.isEmpty() ? model : model.withSaid(said);
    }
    return this;
  }
}

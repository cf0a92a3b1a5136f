package tunwarden.screen.terminal;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.terminal.ansi.ANSITerminal;
import java.io.BufferedOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.jline.terminal.Attributes;
import org.jline.terminal.Size;
import org.jline.terminal.Terminal;
import org.jline.terminal.TerminalBuilder;

/** A console reached through JLine, which is how a Windows console can be used. */
final class JlineTerminal extends ANSITerminal {
  private final Terminal console;
  private final Attributes before;

  JlineTerminal() throws IOException {
    this(TerminalBuilder.builder().system(true).nativeSignals(true).dumb(false).build());
  }

  JlineTerminal(Terminal console) throws IOException {
    super(
        new PumpedInput(console.input()),
        new BufferedOutputStream(console.output()),
        StandardCharsets.UTF_8);
    this.console = console;
    this.before = console.enterRawMode();
    Attributes raw = console.getAttributes();
    raw.setLocalFlag(Attributes.LocalFlag.ISIG, false);
    raw.setInputFlag(Attributes.InputFlag.IXON, false);
    console.setAttributes(raw);
    console.handle(Terminal.Signal.WINCH, signal -> resized());
    resized();
  }

  private void resized() {
    TerminalSize size = findTerminalSize();
    onResized(size.getColumns(), size.getRows());
  }

  @Override
  protected TerminalSize findTerminalSize() {
    Size size = console.getSize();
    return size.getColumns() > 0 && size.getRows() > 0
        ? new TerminalSize(size.getColumns(), size.getRows())
        : new TerminalSize(80, 24);
  }

  /** The terminal library does not flush what it writes on leaving. */
  @Override
  public void exitPrivateMode() throws IOException {
    super.exitPrivateMode();
    flush();
  }

  @Override
  public void close() throws IOException {
    console.setAttributes(before);
    super.close();
    console.close();
  }
}

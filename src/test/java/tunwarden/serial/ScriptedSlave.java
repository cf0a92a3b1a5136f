package tunwarden.serial;

import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.function.Function;
import tunwarden.pty.Pty;

/**
 * Plays an instrument on the master side of a pseudo-terminal: each request of eight bytes is
 * answered by a script, in pieces, each after its own delay.
 */
final class ScriptedSlave implements AutoCloseable {
  private final Pty pty;
  private final Function<byte[], List<Piece>> script;
  private final Thread thread;
  private final List<byte[]> requests = new CopyOnWriteArrayList<>();
  private volatile boolean closing;

  /** Bytes sent after a delay. */
  record Piece(int delayMs, byte[] bytes) {
    static Piece now(byte[] bytes) {
      return new Piece(0, bytes);
    }
  }

  ScriptedSlave(Pty pty, Function<byte[], List<Piece>> script) {
    this.pty = pty;
    this.script = script;
    this.thread = new Thread(this::run, "scripted slave");
    thread.start();
  }

  private void run() {
    byte[] held = new byte[0];
    while (!closing) {
      byte[] got = pty.receive(20);
      int before = held.length;
      held = Arrays.copyOf(held, before + got.length);
      System.arraycopy(got, 0, held, before, got.length);
      while (held.length >= 8) {
        byte[] request = Arrays.copyOf(held, 8);
        held = Arrays.copyOfRange(held, 8, held.length);
        requests.add(request);
        for (Piece piece : script.apply(request)) {
          Eventually.sleep(piece.delayMs());
          pty.send(piece.bytes());
        }
      }
    }
  }

  List<byte[]> requests() {
    return requests;
  }

  @Override
  public void close() {
    closing = true;
    try {
      thread.join(3000);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}

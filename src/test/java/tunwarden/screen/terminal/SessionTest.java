package tunwarden.screen.terminal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.input.KeyStroke;
import com.googlecode.lanterna.input.KeyType;
import com.googlecode.lanterna.terminal.virtual.DefaultVirtualTerminal;
import java.io.OutputStream;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;
import tunwarden.screen.Boards;
import tunwarden.screen.RecordingDesk;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Origin;

/** The running dashboard with its threads: every way out gives the terminal back. */
class SessionTest {
  private static final Duration PATIENCE = Duration.ofSeconds(20);

  /** Remembers whether it was given back. */
  private static final class Watched extends DefaultVirtualTerminal {
    private volatile boolean inScreen;
    private volatile int entered;
    private int bells;
    private volatile boolean closed;
    private final CountDownLatch stalled = new CountDownLatch(1);
    private volatile boolean stalls;

    Watched() {
      super(new TerminalSize(80, 24));
    }

    @Override
    public void enterPrivateMode() {
      inScreen = true;
      entered++;
      super.enterPrivateMode();
    }

    @Override
    public void exitPrivateMode() {
      inScreen = false;
      super.exitPrivateMode();
    }

    @Override
    public void close() {
      closed = true;
      super.close();
    }

    @Override
    public void bell() {
      bells++;
    }

    @Override
    public void flush() {
      if (stalls) {
        try {
          stalled.await();
        } catch (InterruptedException e) {
          Thread.currentThread().interrupt();
        }
      }
      super.flush();
    }

    void wasGivenBack() {
      assertEquals(1, entered);
      assertFalse(inScreen);
      assertTrue(closed);
    }
  }

  private final Watched terminal = new Watched();
  private final RecordingDesk desk = new RecordingDesk();

  private void run(Supplier<Board> latest) {
    DashboardOptions options =
        new DashboardOptions(Look.USUAL, false, false, OutputStream.nullOutputStream(), () -> {});
    assertTimeoutPreemptively(PATIENCE, () -> Dashboard.runOn(terminal, latest, desk, options));
  }

  private static Board calm() {
    return Boards.many(3, Boards.NOW);
  }

  private void type(String keys) {
    keys.chars().forEach(c -> terminal.addInput(new KeyStroke((char) c, false, false)));
  }

  @Test
  void theLetterLeaves() {
    type("vuq");
    run(SessionTest::calm);
    terminal.wasGivenBack();
    assertEquals(List.of("remember PSI DARK BLOCKS"), desk.asked());
  }

  @Test
  void controlCLeavesEvenWithAlarmsWaiting() {
    terminal.addInput(new KeyStroke('c', true, false));
    run(() -> Boards.three(Origin.LIVE, Boards.NOW));
    terminal.wasGivenBack();
  }

  @Test
  void theBellRingsForANewAlarmOnlyWhereItIsWanted() {
    assertEquals(1, bellsWith(true));
    assertEquals(0, bellsWith(false));
  }

  private int bellsWith(boolean wanted) {
    Watched watched = new Watched();
    DashboardOptions options =
        new DashboardOptions(
            Look.USUAL,
            false,
            wanted,
            OutputStream.nullOutputStream(),
            () -> watched.addInput(new KeyStroke('c', true, false)));
    Board board = Boards.three(Origin.LIVE, Boards.NOW);
    assertTimeoutPreemptively(PATIENCE, () -> Dashboard.runOn(watched, () -> board, desk, options));
    return watched.bells;
  }

  @Test
  void theEndOfInputLeaves() {
    terminal.addInput(new KeyStroke(KeyType.EOF));
    run(SessionTest::calm);
    terminal.wasGivenBack();
  }

  @Test
  void aFailureWhileDrawingGivesTheTerminalBackAndIsNotSwallowed() {
    AtomicInteger calls = new AtomicInteger();
    Supplier<Board> failing =
        () -> {
          if (calls.incrementAndGet() > 2) {
            throw new IllegalStateException("no board");
          }
          return calm();
        };
    assertEquals(
        "no board", assertThrows(IllegalStateException.class, () -> run(failing)).getMessage());
    terminal.wasGivenBack();
  }

  @Test
  void anInterruptLeaves() throws InterruptedException {
    Thread thread = start();
    waitFor("3 vessels");
    thread.interrupt();
    thread.join(PATIENCE.toMillis());
    assertFalse(thread.isAlive());
    terminal.wasGivenBack();
  }

  @Test
  void aStalledTerminalHoldsUpNeitherKeysNorLeaving() throws InterruptedException {
    Thread thread = start();
    waitFor("3 vessels");
    terminal.stalls = true;
    type("ttt");
    Thread.sleep(500);
    type("tq");
    thread.join(PATIENCE.toMillis());
    assertFalse(thread.isAlive(), "leaving does not wait for a terminal that takes no output");
    assertEquals(4, desk.asked().size(), "keys are still acted upon");
    terminal.stalled.countDown();
  }

  @Test
  void theScreenShowsWhatTheBoardSays() throws InterruptedException {
    Thread thread = start();
    waitFor("3 vessels");
    type("q");
    thread.join(PATIENCE.toMillis());
    assertFalse(thread.isAlive());
  }

  private Thread start() {
    DashboardOptions options =
        new DashboardOptions(Look.USUAL, false, false, OutputStream.nullOutputStream(), () -> {});
    Thread thread = new Thread(() -> Dashboard.runOn(terminal, SessionTest::calm, desk, options));
    thread.setDaemon(true);
    thread.start();
    return thread;
  }

  private void waitFor(String words) throws InterruptedException {
    for (int i = 0; i < 800 && !screen().contains(words); i++) {
      Thread.sleep(25);
    }
    assertTrue(screen().contains(words), screen());
  }

  private String screen() {
    StringBuilder all = new StringBuilder();
    for (int y = 0; y < 24; y++) {
      for (int x = 0; x < 80; x++) {
        all.append(terminal.getCharacter(x, y).getCharacterString());
      }
      all.append('\n');
    }
    return all.toString();
  }
}

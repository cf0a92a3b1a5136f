package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.PrintWriter;
import java.io.StringWriter;

/**
 * What one run of the program in process did.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
public record Ran(int code, String out, String err) {
  /** Runs the program with these arguments. */
  public static Ran tunwarden(String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code = Main.run(new PrintWriter(out), new PrintWriter(err), args);
    return new Ran(code, out.toString(), err.toString());
  }

  /** The output of a run that must succeed silently. */
  public String ok() {
    assertEquals("", err);
    assertEquals(0, code);
    return out;
  }

  /** The one sentence of a run that must refuse its input. */
  public String refused() {
    assertEquals("", out);
    assertEquals(2, code, err);
    assertEquals(1, err.lines().count(), err);
    return err.strip();
  }
}
